import { plateLabel } from '@/shared/sequence/address/label';
import { readAddress } from '@/shared/sequence/address/read-address';

// Form: the product's own description of a plate, `c E59`.
test.each([
  [{ family: 'c', letter: 'E', label: '59' }, 'c E59'],
  [{ family: 'β', letter: 'K', label: '162' }, 'β K162'],
  [{ family: 'OSCP', letter: 'M', label: '-4' }, 'OSCP M-4'],
  [{ family: null, letter: 'E', label: '59' }, 'E59'],
  [{ family: 'c', letter: 'E', label: null }, 'c E–'],
] as const)('%j', (residue, plate) => {
  expect(plateLabel(residue)).toBe(plate);
});

test('what is printed on a plate is read back', () => {
  const context = { families: ['c', 'β', 'OSCP'].map((name) => ({ name, aliases: [] })), chainIds: [] };
  for (const family of ['c', 'β', 'OSCP'])
    for (const [letter, label] of [
      ['E', '59'],
      ['W', '-4'],
    ] as const) {
      const printed = plateLabel({ family, letter, label });
      expect(readAddress(printed, context).readings[0]).toMatchObject({ family, letter, label });
    }
});
