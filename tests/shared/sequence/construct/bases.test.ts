import fc from 'fast-check';
import {
  complement,
  countDifferences,
  IUPAC_BASES,
  readBases,
  reverseComplement,
} from '@/shared/sequence/construct/bases';

const letters = fc.constantFrom(...'ACGTRYSWKMBDHVNacgtryswkmbdhvn');
const dna = fc.string({ unit: letters, maxLength: 200 });

test('the reverse complement is its own inverse for all 15 letters, case kept', () => {
  fc.assert(fc.property(dna, (bases) => reverseComplement(reverseComplement(bases)) === bases));
  fc.assert(fc.property(dna, (bases) => complement(complement(bases)) === bases));
});

// Cornish-Bowden 1985 NAR 13:3021: R↔Y, K↔M, B↔V, D↔H; S, W, N with themselves.
test('each letter pairs with the letter for the complements of its bases', () => {
  const pairOf: Record<string, string> = { A: 'T', C: 'G', G: 'C', T: 'A' };
  for (const [letter, bases] of Object.entries(IUPAC_BASES)) {
    const partners = [...bases]
      .map((base) => pairOf[base])
      .sort()
      .join('');
    expect(IUPAC_BASES[complement(letter)]).toBe(partners);
  }
  expect(reverseComplement('AACRn')).toBe('nYGTT');
});

test('what is no base stays where it is, in any alphabet', () => {
  expect(complement('A-β*T')).toBe('T-β*A');
  expect(reverseComplement('Aβ')).toBe('βT');
});

test('bases are read along either strand and round a circle', () => {
  expect(readBases('AACCGT', 1, 3, '+')).toBe('ACC');
  expect(readBases('AACCGT', 4, 4, '+')).toBe('GTAA');
  expect(readBases('AACCGT', 5, 3, '-')).toBe('ACG');
  expect(readBases('AACCGT', 1, 4, '-')).toBe('TTAC');
  expect(readBases('AAC', 0, 7, '+')).toBe('AACAACA');
  expect(readBases('', 0, 3, '+')).toBe('');
});

test('differences are counted place by place', () => {
  expect(countDifferences('GAT', 'AAC')).toBe(2);
});
