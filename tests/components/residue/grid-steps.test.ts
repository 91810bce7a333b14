import { gridStep } from '@/components/residue/grid-steps';

it.each([
  ['ArrowRight', 4, 5],
  ['ArrowLeft', 4, 3],
  ['ArrowDown', 4, 14],
  ['ArrowUp', 14, 4],
  ['Home', 17, 10],
  ['End', 12, 19],
  ['End', 22, 24],
])('%s leads from %d to %d in a field of 25', (key, from, to) => {
  expect(gridStep(key, from, 25)).toBe(to);
});

it.each(['ArrowUp', 'ArrowLeft'])('%s stays at the first letter', (key) => {
  expect(gridStep(key, 0, 25)).toBe(0);
});

it('stays where no row is below', () => {
  expect(gridStep('ArrowDown', 18, 25)).toBe(18);
});

it('leaves other keys alone', () => {
  expect(gridStep('Enter', 4, 25)).toBeUndefined();
});
