import fc from 'fast-check';
import { readAddress } from '@/shared/sequence/address/read-address';
import type { AddressContext, AddressReading } from '@/shared/sequence/address/types';

const families = (...names: string[]) => names.map((name) => ({ name, aliases: [] }));
const motorF: AddressContext = {
  families: [...families('α', 'β', 'γ', 'δ', 'ε', 'a', 'b'), { name: 'c', aliases: ['III', 'atpE'] }],
  chainIds: ['A', 'K', 'AA', '7'],
};
const motorV: AddressContext = {
  families: families('A', 'B', 'C', 'D', 'E', 'a', 'c', 'e', "c'"),
  chainIds: [],
};

/** Short form of what a reading says: `β Glu188`, `Lys59`, `chain K 59`, `59`. */
function short({ family, chainId, letter, label, mutationTo }: AddressReading): string {
  if (chainId !== null) return `chain ${chainId} ${label}`;
  return `${family === null ? '' : `${family} `}${letter ?? ''}${label}${mutationTo === null ? '' : `>${mutationTo}`}`;
}
const read = (text: string, context = motorF) => readAddress(text, context).readings.map(short);

// Source: handbook 6.3 (grammar and table of ambiguities), rows 30 to 32 of its acceptance checks, and the
// spellings of the product's own description.
describe('addresses as people in the field write them', () => {
  test.each([
    ['cE59', ['c E59']],
    ['c-E59', ['c E59']],
    ['c E59', ['c E59']],
    ['c_E59', ['c E59']],
    ['cGlu#59A', ['c E59A']],
    ['c.E59', ['c E59']],
    ['c/E59', ['c E59']],
    ['cGlu59', ['c E59']],
    ['IIIE59', ['c E59']],
    ['βK162', ['β K162']],
    ['betaGlu188', ['β E188']],
    ['BetaE188', ['β E188']],
    ['Glu59', ['E59']],
    ['glu59', ['E59']],
    ['59', ['59']],
    ['-4', ['-4']],
    ['\u22124', ['-4']],
    ['E59Q', ['E59>Q']],
    ['Glu59Gln', ['E59>Q']],
    ['W26*', ['W26>*']],
    ['Trp26Ter', ['W26>*']],
    ['D61X', ['D61>X']],
    ['cE59Q', ['c E59>Q']],
    ['K:59', ['chain K 59']],
    ['AA:-4', ['chain AA -4']],
    ['7:52A', ['chain 7 52A']],
  ])('%s', (text, expected) => {
    expect(read(text)).toEqual(expected);
  });

  test('β in Greek, as ß, as the symbol ϐ; full-width and subscript digits (row 32)', () => {
    for (const text of ['βE188', 'ßE188', '\u03d0E188', 'β\uff25\uff11\uff18\uff18', 'βE₁₈₈', 'β\u2013E188'])
      expect([text, read(text)]).toEqual([text, ['β E188']]);
    expect(read('\u03f59')[0]).toBe('ε 9');
  });

  test('a prime belongs to the family', () => {
    expect(read('c\u2032E145', motorV)).toEqual(["c' E145"]);
    expect(read("c'145", motorV)).toEqual(["c' 145"]);
  });
});

describe('ambiguous addresses list every reading, likeliest first', () => {
  test.each([
    ['cE59', motorV, ['c E59']],
    ['CE59', motorV, ['C E59']],
    ['CE59', motorF, ['c E59']],
    ['a210', motorF, ['a 210', 'A210', 'chain A 210']],
    ['A210', motorV, ['A 210', 'A210', 'a 210']],
    ['E59', motorF, ['E59', 'ε 59']],
    ['E59', motorV, ['E 59', 'E59', 'e 59']],
    ['D61', motorF, ['D61']],
    ['D61', motorV, ['D 61', 'D61']],
    ['b-10', motorF, ['b 10', 'b -10']],
    ['K59', motorF, ['K59', 'chain K 59']],
    ['H245', motorF, ['H245']],
    ['bE188', motorF, ['b E188', 'β E188']],
    ['59A', motorF, ['59A', '59>A']],
    ['c59A', motorF, ['c 59A', 'c 59>A', 'C59>A']],
    ['M1', motorF, ['M1']],
    ['c62', motorF, ['c 62', 'C62']],
    ['a-210', motorF, ['a 210']],
    ['Glu-59', motorF, ['E59', 'E-59']],
  ] as const)('%s', (text, context, expected) => {
    expect(read(text, context)).toEqual(expected);
  });

  test('F6 is family F residue 6, Phe6, and perhaps the family F6', () => {
    const context = { families: families('F', 'F6'), chainIds: [] };
    expect(read('F6', context)).toEqual(['F 6', 'F6']);
    expect(readAddress('F6', context).notReadAs[0]).toContain('the family F6 as a whole');
    expect(read('F610', context)).toEqual(['F6 10', 'F 610', 'F610']);
  });
});

test('what it was not read as is said, with the way to write it', () => {
  const notes = (text: string, context = motorF) => readAddress(text, context).notReadAs.join(' ');
  expect(notes('a210')).toBe('Not read as α: a bare a is never α. Write α210 or alpha210.');
  expect(notes('A210')).toContain('Not read as family A: this project has none.');
  expect(notes('E59Q', motorV)).toContain('Not read as family E: E59Q is a change of Glu59. Write E-59Q.');
  expect(notes('cE59', motorV)).toContain('Not read as family C: case counts. Write CE59.');
  expect(notes('Z:59')).toContain('no current structure has a chain of this name');
});

test('qualifiers go with every reading and with its spelling', () => {
  const { readings } = readAddress('c62 {mature} @ Orvella tarda', motorF);
  expect(readings).toHaveLength(2);
  for (const reading of readings)
    expect(reading).toMatchObject({ organism: 'Orvella tarda', numbering: 'mature' });
  expect(readings[0]?.spelling).toBe('c_62 {mature} @ Orvella tarda');
  expect(readAddress('cD61@Orvella tarda', motorF).readings[0]?.organism).toBe('Orvella tarda');
});

test('a chain in other case, or a family before a colon, is offered and says why', () => {
  expect(read('k:59')).toEqual(['chain K 59']);
  expect(readAddress('k:59', motorF).readings[0]?.reason).toContain('in other case');
  expect(read('c:62')).toEqual(['c 62']);
  expect(readAddress('K:59 CA', motorF).readings[0]).toMatchObject({ atom: 'CA', spelling: 'K:59 CA' });
});

test.each(['', ' ', 'hello', 'c', 'β', 'cE', '@', '{}', ':', 'K:', 'cE59QQQ', '1234567', 'x'.repeat(10_000)])(
  'no address: %p',
  (text) => {
    expect(readAddress(text, motorF).readings).toEqual([]);
  },
);

describe('properties', () => {
  const piece = fc.constantFrom(
    ...[
      'α',
      'β',
      'b',
      'c',
      'a',
      'A',
      'E',
      'e',
      'C',
      'D',
      "c'",
      'beta',
      'Glu',
      'Asp',
      'Q',
      '*',
      'Ter',
      'X',
      'B',
    ],
    ...[
      '1',
      '59',
      '210',
      'Glu#59e',
      '-',
      '_',
      ' ',
      '.',
      '/',
      ':',
      '#',
      'K',
      'AA',
      'III',
      '\u2212',
      '@',
      '{',
      '}',
    ],
  );
  const text = fc.array(piece, { minLength: 1, maxLength: 6 }).map((parts) => parts.join(''));
  const context = fc.constantFrom(motorF, motorV);

  test('the spelling of a reading leaves only that reading', () => {
    let checked = 0;
    fc.assert(
      fc.property(text, context, (typed, names) => {
        for (const reading of readAddress(typed, names).readings) {
          const again = readAddress(reading.spelling, names).readings;
          expect([typed, reading.spelling, again.map(short)]).toEqual([
            typed,
            reading.spelling,
            [short(reading)],
          ]);
          checked += 1;
        }
      }),
      { numRuns: 5000 },
    );
    expect(checked).toBeGreaterThan(300);
  });

  test('no text makes it throw, and no reading is listed twice', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.string({ unit: 'binary' }), text), context, (typed, names) => {
        const { readings } = readAddress(typed, names);
        expect(new Set(readings.map(short)).size).toBe(readings.length);
        for (const { reason, group } of readings) expect(reason.length * group.length).toBeGreaterThan(0);
      }),
      { numRuns: 1000 },
    );
  });
});
