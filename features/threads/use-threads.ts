import { useInfiniteQuery, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useCallback, useMemo, useState, useSyncExternalStore } from 'react';
import { subjectKey, threads, type Subject } from '@/shared/contracts/threads';
import { call } from '@/client/api';
import { livePages } from '@/client/live-pages';
import { liveQuery } from '@/client/live-query';
import { outbox } from '@/client/outbox';
import type { ApiProblem } from '@/client/problem';
import { laneOf, type QueuedMessage } from '@/client/queued-message';
import {
  applyToThreadOfSubject,
  applyToThreadPages,
  mergeThread,
  prependEarlier,
  type SubjectThread,
  type ThreadPage,
} from './apply-thread-event';
import { joinLines } from './thread-lines';

const key = (projectId: string, ...rest: string[]) => ['project', projectId, 'threads', ...rest];

export const threadsQuery = (projectId: string) =>
  livePages<ThreadPage, number>({
    projectId,
    queryKey: key(projectId),
    read: (before, signal) => call(threads.list, { params: { projectId }, query: { before }, signal }),
    next: (page) => page.next,
    apply: applyToThreadPages,
  });

export const threadOfSubjectQuery = (projectId: string, of: string) =>
  liveQuery<SubjectThread>({
    projectId,
    queryKey: key(projectId, 'of', of),
    async read(signal) {
      const view = await call(threads.ofSubject, {
        params: { projectId, subjectKey: of },
        query: {},
        signal,
      });
      for (const { clientKey } of view.messages) void outbox.acknowledge(clientKey);
      return view;
    },
    apply: (view, fact) => applyToThreadOfSubject(view, fact, of),
    merge: mergeThread,
  });

/** All threads, the one spoken in last first. */
export function useThreads(projectId: string) {
  const query = useInfiniteQuery(threadsQuery(projectId));
  const data = useMemo(() => query.data?.pages.flatMap((page) => page.threads), [query.data]);
  return { ...query, data };
}

/** One's own messages of a subject that are on their way. */
function useQueued(projectId: string, subject: Subject): QueuedMessage[] {
  const lane = laneOf({ projectId, subject });
  const read = useCallback(() => outbox.messagesOf(lane), [lane]);
  return useSyncExternalStore(outbox.subscribe, read, read);
}

/** The main thread of a subject: stored messages and one's own on their way, as one list. */
export function useThreadOfSubject(projectId: string, subject: Subject) {
  const client = useQueryClient();
  const options = threadOfSubjectQuery(projectId, subjectKey(subject));
  const query = useQuery(options);
  const queued = useQueued(projectId, subject);
  const lines = useMemo(() => joinLines(query.data?.messages ?? [], queued), [query.data?.messages, queued]);
  const earlier = useMutation<SubjectThread, ApiProblem, number>({
    mutationFn: (before) =>
      call(threads.ofSubject, { params: { projectId, subjectKey: subjectKey(subject) }, query: { before } }),
    onSuccess: (page) =>
      client.setQueryData<SubjectThread>(options.queryKey, (view) => view && prependEarlier(view, page)),
  });
  const before = query.data?.earlier ?? null;
  return {
    ...query,
    lines,
    hasEarlier: before !== null,
    loadEarlier: () => {
      if (before !== null && !earlier.isPending) earlier.mutate(before);
    },
    isLoadingEarlier: earlier.isPending,
    earlierError: earlier.error,
  };
}

export interface PostMessage {
  /** Resolves when it is stored on this device: then the composer may be emptied. */
  post: (text: string, clientKey?: string) => Promise<QueuedMessage>;
  /** Takes one back that waits or was refused, to write it anew. */
  takeBack: (clientKey: string) => Promise<QueuedMessage | null>;
  tryAgain: (clientKey: string) => Promise<void>;
}

/** The same object while it means the same, though screens make it anew at each drawing. */
function useSameSubject(subject: Subject): Subject {
  const [same, setSame] = useState(subject);
  if (subjectKey(same) === subjectKey(subject)) return same;
  setSame(subject);
  return subject;
}

export function usePostMessage(projectId: string, given: Subject): PostMessage {
  const subject = useSameSubject(given);
  return useMemo(
    () => ({
      post: (text, clientKey) => outbox.add({ projectId, subject, text: text.trim(), clientKey }),
      takeBack: (clientKey) => outbox.takeBack(clientKey),
      tryAgain: (clientKey) => outbox.tryAgain(clientKey),
    }),
    [projectId, subject],
  );
}
