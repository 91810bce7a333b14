import fc from 'fast-check';
import { byText, keepNewer, putNewer } from '@/client/keep-newer';

const thing = fc.record({ id: fc.constantFrom('a', 'b', 'c', 'd'), version: fc.integer({ min: 1, max: 6 }) });
const inOrder = (one: { id: string }, other: { id: string }) => byText(one.id, other.id);

test('the higher version is kept, the held one when they are equal', () => {
  const held = { version: 2 };
  expect(keepNewer(held, { version: 1 })).toBe(held);
  expect(keepNewer(held, { version: 2 })).toBe(held);
  expect(keepNewer(held, { version: 3 })).toEqual({ version: 3 });
  expect(keepNewer(undefined, held)).toBe(held);
});

test('a list comes to the same in whatever order and however often things arrive', () => {
  fc.assert(
    fc.property(fc.array(thing), fc.infiniteStream(fc.nat()), (things, chance) => {
      const put = (list: typeof things, next: (typeof things)[number]) => putNewer(list, next, inOrder);
      const shuffled = [...things, ...things.slice(0, 3)]
        .map((one) => ({ one, at: chance.next().value as number }))
        .sort((a, b) => a.at - b.at)
        .map(({ one }) => one);
      expect(shuffled.reduce(put, [])).toEqual(things.reduce(put, []));
    }),
  );
});

test('a list in which nothing is new stays the same list', () => {
  const list = [{ id: 'a', version: 3 }];
  expect(putNewer(list, { id: 'a', version: 2 }, inOrder)).toBe(list);
});
