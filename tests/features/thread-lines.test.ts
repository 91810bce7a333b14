import { joinLines } from '@/features/threads/thread-lines';
import { idOf, message } from '../client/support/contract-values';

const queued = (clientKey: string, refusal: string | null = null) => ({
  clientKey,
  projectId: idOf(7),
  subject: { kind: 'mutant' as const, id: idOf(70) },
  text: 'on its way',
  queuedAt: 1,
  refusal,
});

test('one’s own message is one line, from whichever side it is known first', () => {
  const stored = message(4);
  expect(joinLines([], [queued(stored.clientKey)])).toMatchObject([
    { state: 'waiting', key: stored.clientKey },
  ]);
  expect(joinLines([stored], [queued(stored.clientKey)])).toEqual([
    { state: 'stored', key: stored.clientKey, message: stored },
  ]);
});

test('what is on its way stands after what is stored, a refused one with its reason', () => {
  const lines = joinLines([message(4)], [queued('a'), queued('b', 'Readers do not write here.')]);
  expect(lines.map(({ state }) => state)).toEqual(['stored', 'waiting', 'refused']);
  expect(lines[2]).toMatchObject({ refusal: 'Readers do not write here.' });
});
