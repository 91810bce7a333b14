import { compactLabel, longLabel, plateLabel, spokenLabel } from '@/shared/sequence/address/label';
import { readAddress } from '@/shared/sequence/address/read-address';

// Forms: the product's own description (`cE59`, `βK162`, `E59Q`) and the plate `c E59`.
test.each([
  [{ family: 'c', letter: 'E', label: '59' }, 'cE59', 'c E59', 'c Glu59', 'c glutamate 59'],
  [{ family: 'β', letter: 'K', label: '162' }, 'βK162', 'β K162', 'β Lys162', 'β lysine 162'],
  [{ family: 'OSCP', letter: 'M', label: '-4' }, 'OSCP-M-4', 'OSCP M-4', 'OSCP Met-4', 'OSCP methionine -4'],
  [
    { family: null, letter: 'E', label: '59', mutationTo: 'Q' },
    'E59Q',
    'E59Q',
    'Glu59Gln',
    'glutamate 59 to glutamine',
  ],
  [{ family: 'c', letter: 'E', label: null }, 'cE–', 'c E–', 'c Glu–', 'c glutamate without a number'],
] as const)('%j', (residue, compact, plate, long, spoken) => {
  expect(compactLabel(residue)).toBe(compact);
  expect(plateLabel(residue)).toBe(plate);
  expect(longLabel(residue)).toBe(long);
  expect(spokenLabel(residue)).toBe(spoken);
});

test('what is printed compactly or on a plate is read back', () => {
  const context = { families: ['c', 'β', 'OSCP'].map((name) => ({ name, aliases: [] })), chainIds: [] };
  for (const family of ['c', 'β', 'OSCP'])
    for (const [letter, label] of [
      ['E', '59'],
      ['W', '-4'],
    ] as const) {
      for (const printed of [compactLabel({ family, letter, label }), plateLabel({ family, letter, label })])
        expect(readAddress(printed, context).readings[0]).toMatchObject({ family, letter, label });
    }
});
