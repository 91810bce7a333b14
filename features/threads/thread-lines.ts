import type { Message } from '@/shared/contracts/threads';
import type { QueuedMessage } from '@/client/queued-message';

/** One message as the thread shows it: stored, or on its way. */
export type ThreadLine =
  | { state: 'stored'; key: string; message: Message }
  | { state: 'waiting'; key: string; queued: QueuedMessage }
  | { state: 'refused'; key: string; queued: QueuedMessage; refusal: string };

/** Stored messages in their order, then one's own on their way. One known from both is the stored one. */
export function joinLines(messages: readonly Message[], queued: readonly QueuedMessage[]): ThreadLine[] {
  const stored = new Set(messages.map(({ clientKey }) => clientKey));
  return [
    ...messages.map((message) => ({ state: 'stored' as const, key: message.clientKey, message })),
    ...queued
      .filter(({ clientKey }) => !stored.has(clientKey))
      .map((one) => {
        const { clientKey: key, refusal } = one;
        return refusal === null
          ? { state: 'waiting' as const, key, queued: one }
          : { state: 'refused' as const, key, queued: one, refusal };
      }),
  ];
}
