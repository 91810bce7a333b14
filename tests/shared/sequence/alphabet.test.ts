import {
  aminoAcid,
  AMINO_ACIDS,
  codeOfLetter,
  compareLetters,
  isGap,
  letterOfCode,
  nameOfLetter,
  STANDARD_LETTERS,
} from '@/shared/sequence/alphabet';

// Source: IUPAC-IUB JCBN 1984 Eur J Biochem 138:9, in the order handbook 3.1 lists letters and codes.
const LETTERS = [...'ARNDCQEGHILKMFPSTWYV', 'B', 'Z', 'J', 'X', 'U', 'O'];
const CODES =
  'Ala Arg Asn Asp Cys Gln Glu Gly His Ile Leu Lys Met Phe Pro Ser Thr Trp Tyr Val Asx Glx Xle Xaa Sec Pyl';

test('letters and codes are those of the nomenclature, both ways, in any case', () => {
  expect(LETTERS.map(codeOfLetter).join(' ')).toBe(CODES);
  expect(CODES.split(' ').map((code) => letterOfCode(code.toUpperCase()))).toEqual(LETTERS);
  expect(codeOfLetter('e')).toBe('Glu');
  expect(codeOfLetter('*')).toBe('Ter');
  expect(letterOfCode('Foo')).toBeUndefined();
  expect(new Set(AMINO_ACIDS.map((acid) => acid.letter)).size).toBe(26);
  expect([nameOfLetter('E'), nameOfLetter('D')]).toEqual(['Glutamate', 'Aspartate']);
});

test('every standard letter has a chemistry, ambiguous ones have none', () => {
  const of = (chemistry: string) =>
    [...STANDARD_LETTERS].filter((a) => aminoAcid(a)?.chemistry === chemistry);
  expect(of('acidic').join('')).toBe('DE');
  expect(of('basic').join('')).toBe('RHK');
  expect(of('aromatic').join('')).toBe('FWY');
  expect([...STANDARD_LETTERS].filter((a) => !aminoAcid(a)?.chemistry)).toEqual([]);
  expect(['B', 'Z', 'J', 'X'].map((a) => aminoAcid(a)?.chemistry)).toEqual(Array(4).fill(null));
});

test('B, Z, J and X are never identical and never a mismatch (handbook 3.1)', () => {
  for (const letter of 'BZJX') {
    expect(compareLetters(letter, letter)).toBe('undetermined');
    expect(compareLetters('D', letter.toLowerCase())).toBe('undetermined');
  }
  expect(compareLetters('d', 'D')).toBe('identical');
  expect(compareLetters('U', 'C')).toBe('different');
});

test('gaps are - . and ~, never a blank (handbook 3.2)', () => {
  expect(['-', '.', '~', ' ', '?', '*'].map(isGap)).toEqual([true, true, true, false, false, false]);
});
