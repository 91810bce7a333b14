// What the list of threads says of the last message: its words, without marks and without losing a sign of a name.
import { lastWords } from '@/features/threads/last-words';

const said = (text: string) =>
  lastWords({
    lastMessage: {
      id: '01900000-0000-7000-8000-000000000001',
      threadId: '01900000-0000-7000-8000-000000000002',
      eventNumber: 1,
      text,
      by: { id: '01900000-0000-7000-8000-000000000003', name: 'Oda' },
      at: '2030-01-01T00:00:00.000Z',
      clientKey: '01900000-0000-7000-8000-000000000004',
    },
  });

test.each([
  ['does **cE62** face c_61, or `A:62`?', 'does cE62 face c_61, or A:62?'],
  ['# Plan\n\n> as said\n- first *Orvella tarda*, then _all_', 'Plan as said first Orvella tarda, then all'],
  ['[the gel](https://example.org/gel) and 5 > 3, D60* stops, 2*3', 'the gel and 5 > 3, D60* stops, 2*3'],
  ['a_1 _b_ **bold _both_** ~~old~~', 'a_1 b bold both old'],
])('%s', (text, words) => {
  expect(said(text)).toBe(`Oda: ${words}`);
});

test('long ones end with a sign that there is more, empty threads say so', () => {
  expect(said('long '.repeat(40))).toMatch(/^Oda: (long ){17}long…$/);
  expect(lastWords({ lastMessage: null })).toBe('nothing said yet');
});
