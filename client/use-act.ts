import { useMutation, type UseMutationResult } from '@tanstack/react-query';
import { useState } from 'react';
import { ActKeys } from './act-keys';
import type { Fact } from './facts';
import { liveProjects } from './live-projects';
import type { ApiProblem } from './problem';

interface OwnAct<Given, Reply> {
  send: (given: Given, idempotencyKey: string) => Promise<Reply>;
  /** Takes the reply into what is held. */
  take: (reply: Reply, given: Given) => void;
}

export type ActResult<Given, Reply> = UseMutationResult<Reply, ApiProblem, Given>;

/** One writing act. Never sent again by itself; sent again by hand it is still done once. */
export function useOwnAct<Given, Reply>({ send, take }: OwnAct<Given, Reply>): ActResult<Given, Reply> {
  const [keys] = useState(() => new ActKeys());
  return useMutation<Reply, ApiProblem, Given>({
    mutationFn: (given) => send(given, keys.keyFor(given)),
    onSuccess: (reply, given) => {
      keys.answered();
      take(reply, given);
    },
    onError: (error) => keys.answered(error),
  });
}

interface ProjectAct<Given, Reply> {
  send: OwnAct<Given, Reply>['send'];
  /** What the reply tells, as its events will: it goes the same way into the cache. */
  tells: (reply: Reply, given: Given) => Fact[];
}

/** A writing act of a project. */
export function useAct<Given, Reply>(projectId: string, { send, tells }: ProjectAct<Given, Reply>) {
  return useOwnAct<Given, Reply>({
    send,
    take: (reply, given) => liveProjects.tell(projectId, tells(reply, given)),
  });
}
