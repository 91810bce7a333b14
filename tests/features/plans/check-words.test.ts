import type { Design } from '@/shared/contracts/plans';
import { checkLines, figure, leadingDesign, linesOfDesign, summaryOf } from '@/features/plans/check-words';

type Check = Design['checks'][number];
const check = (change: Partial<Check>): Check => ({
  name: 'self-dimer',
  label: 'Self dimer, kcal/mol',
  primer: null,
  severity: 'advice',
  passed: true,
  value: -4.6,
  limit: 'look below -6',
  basis: 'common practice, no source',
  ...change,
});

test('both primers stand in one line; the worse result counts and says whose it is', () => {
  const [line] = checkLines([
    check({ primer: 'E62Q_F' }),
    check({ primer: 'E62Q_R', value: -9.44, passed: false, severity: 'limit' }),
  ]);
  expect(line).toEqual({
    key: 'self-dimer',
    result: 'failed',
    name: 'Self dimer',
    value: '−4.6 and −9.4 kcal/mol',
    limit: 'only E62Q_R · limit: look below −6 · common practice, no source',
  });
});

test('an equal value is said once, a missed advice is to be looked at', () => {
  const lines = checkLines([check({ passed: false }), check({ passed: false })]);
  expect(lines).toMatchObject([{ result: 'look', value: '−4.6 kcal/mol' }]);
});

test('a design that was not read back never passes whole', () => {
  const lines = linesOfDesign({ checks: [check({})], proved: false, proof: 'The product differs.' });
  expect(summaryOf(lines)).toBe('1 passed, 1 failed');
});

test('what is not proved does not lead, chosen or not', () => {
  const unproved = { proved: false, chosen: true };
  const proved = { proved: true, chosen: false };
  expect(leadingDesign([unproved, proved])).toBe(proved);
  expect(leadingDesign([unproved])).toBeUndefined();
  expect(leadingDesign([proved, { proved: true, chosen: true }])?.chosen).toBe(true);
});

test.each([
  [null, 'not known'],
  [0, '0'],
  [-0.04, '0'],
  [33, '33'],
  [-4.66, '−4.7'],
])('%p is written %p', (value, words) => {
  expect(figure(value)).toBe(words);
});
