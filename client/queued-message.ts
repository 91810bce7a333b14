import { z } from 'zod';
import { subject, subjectKey, type Subject } from '@/shared/contracts/threads';

const day = 24 * 60 * 60_000;

export const queuedMessage = z.object({
  clientKey: z.string(),
  projectId: z.string(),
  subject,
  text: z.string(),
  /** By this device's clock: only its own messages are put in order by it. */
  queuedAt: z.number(),
  /** Set when the server refused it: why, in words. */
  refusal: z.string().nullable(),
});
export type QueuedMessage = z.infer<typeof queuedMessage>;

/** Messages of one lane are sent in order; one that waits holds up only its own lane. */
export function laneOf({ projectId, subject }: { projectId: string; subject: Subject }): string {
  return `${projectId}/${subjectKey(subject)}`;
}

/** Where its text is kept as a draft: the place of the thread's composer. */
export function composerPlace(of: { projectId: string; subject: Subject }): string {
  return `thread:${laneOf(of)}`;
}

/** Too old to be sent without being looked at again. */
export function hasAged(message: QueuedMessage, now: number): boolean {
  return now - message.queuedAt > day;
}

export function inSendingOrder(one: QueuedMessage, other: QueuedMessage): number {
  return one.queuedAt - other.queuedAt || (one.clientKey < other.clientKey ? -1 : 1);
}
