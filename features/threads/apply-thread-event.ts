import type { z } from 'zod';
import type { Message, Thread, threads } from '@/shared/contracts/threads';
import { outOfDate, type Applied, type Fact } from '@/client/facts';
import { putBy } from '@/client/keep-newer';
import { relabels } from '@/client/relabels';

export type SubjectThread = z.infer<typeof threads.ofSubject.reply>;
export type ThreadPage = z.infer<typeof threads.list.reply>;

const lastOf = (thread: Thread | null) => thread?.lastMessage?.eventNumber ?? 0;

/** Messages in their order, each once. */
function putMessage(messages: Message[], next: Message): Message[] {
  return putBy(
    messages,
    next,
    ({ id }) => id === next.id,
    (one, other) => one.eventNumber - other.eventNumber,
    (old) => old,
  );
}

/** The main thread of one subject with its newest messages. */
export function applyToThreadOfSubject(
  view: SubjectThread,
  fact: Fact,
  subjectKey: string,
): Applied<SubjectThread> {
  if (fact.kind === 'message.posted' && fact.payload.thread.subjectKey === subjectKey) {
    const { message, thread } = fact.payload;
    // Older than what is shown: it belongs to a part that is read when somebody looks there.
    const isEarlier = view.earlier !== null && message.eventNumber < (view.messages[0]?.eventNumber ?? 0);
    const messages = isEarlier ? view.messages : putMessage(view.messages, message);
    const isNewer = lastOf(thread) > lastOf(view.thread);
    if (messages === view.messages && !isNewer) return view;
    const { caption, residue } = isNewer ? thread : view;
    return { ...view, messages, caption, residue, thread: isNewer ? thread : view.thread };
  }
  return changesCaption(fact, [view.residue], subjectKey) ? outOfDate : view;
}

/** Pages of threads, the one spoken in last first. Where the second page began stays where it was. */
export function applyToThreadPages(pages: ThreadPage[], fact: Fact): Applied<ThreadPage[]> {
  const all = pages.flatMap((page) => page.threads);
  if (fact.kind === 'message.posted') {
    const { thread } = fact.payload;
    const old = all.find(({ id }) => id === thread.id);
    if (old && lastOf(old) >= lastOf(thread)) return pages;
    return pages.map((page, at) => {
      const others = page.threads.filter(({ id }) => id !== thread.id);
      return {
        ...page,
        threads: at === 0 ? [thread, ...others].sort((a, b) => lastOf(b) - lastOf(a)) : others,
      };
    });
  }
  const touched = all.some(({ residue, subjectKey }) => changesCaption(fact, [residue], subjectKey));
  return touched ? outOfDate : pages;
}

/** What was read now, with what was read before beyond it; a hole between them drops the older part. */
export function mergeThread(held: SubjectThread, fresh: SubjectThread): SubjectThread {
  const first = fresh.messages[0]?.eventNumber;
  const lastHeld = held.messages.at(-1)?.eventNumber ?? 0;
  if (first === undefined || fresh.earlier === null || lastHeld < first) return fresh;
  const before = held.messages.filter(({ eventNumber }) => eventNumber < first);
  return before.length === 0
    ? fresh
    : { ...fresh, messages: [...before, ...fresh.messages], earlier: held.earlier };
}

/** Puts an earlier page before what is shown. */
export function prependEarlier(view: SubjectThread, page: SubjectThread): SubjectThread {
  const first = view.messages[0]?.eventNumber ?? Infinity;
  const before = page.messages.filter(({ eventNumber }) => eventNumber < first);
  return { ...view, messages: [...before, ...view.messages], earlier: page.earlier };
}

function changesCaption(fact: Fact, residues: Thread['residue'][], subjectKey: string): boolean {
  if (fact.kind === 'structure.changed') return subjectKey === `structure:${fact.payload.id}`;
  if (fact.kind === 'mutant.changed') return subjectKey === `mutant:${fact.payload.id}`;
  if (fact.kind === 'annotation.changed') return subjectKey === `annotation:${fact.payload.id}`;
  return relabels(fact, residues);
}
