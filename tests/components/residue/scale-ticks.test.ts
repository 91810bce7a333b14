import { majorStep, placePercent, scaleTicks } from '@/components/residue/scale-ticks';

const fromOne = (index: number): string => String(index + 1);

test('a chain of 76 has a tick for each residue, numbers at the tens', () => {
  const ticks = scaleTicks(76, fromOne);
  expect(ticks).toHaveLength(76);
  expect(ticks.filter((tick) => tick.label).map((tick) => tick.label)).toEqual([
    '10',
    '20',
    '30',
    '40',
    '50',
    '60',
    '70',
  ]);
  expect(ticks.filter((tick) => tick.kind === 'middle').map((tick) => tick.index + 1)).toEqual([
    5, 15, 25, 35, 45, 55, 65, 75,
  ]);
});

test('at most ten numbers are written, however long the chain', () => {
  for (const length of [1, 10, 99, 100, 101, 467, 512, 1024, 5000, 33_000]) {
    const labels = scaleTicks(length, fromOne).filter((tick) => tick.label);
    expect(labels.length).toBeLessThanOrEqual(10);
    expect(length / majorStep(length)).toBeLessThanOrEqual(10);
  }
});

test('ticks follow the numbering shown, not the index', () => {
  const offset = (index: number): string => String(index - 12);
  const zero = scaleTicks(40, offset).find((tick) => tick.label === '0');
  expect(zero?.index).toBe(12);
});

test('an inserted residue carries no tick', () => {
  const labels = ['50', '51', '52', '52A', '53'];
  const ticks = scaleTicks(5, (index) => labels[index] ?? '');
  expect(ticks.map((tick) => tick.index)).toEqual([0, 1, 2, 4]);
});

test('a residue stands in the middle of its share of the line', () => {
  expect(placePercent(0, 10)).toBe(5);
  expect(placePercent(9, 10)).toBe(95);
  expect(placePercent(0, 0)).toBe(0);
});
