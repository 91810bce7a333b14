/** Which strand of the DNA as it was given: `+` as written, `-` its reverse complement. */
export type Strand = '+' | '-';

/** Bases a IUPAC letter stands for. Source: Cornish-Bowden 1985 NAR 13:3021. */
export const IUPAC_BASES: Readonly<Record<string, string>> = {
  A: 'A',
  C: 'C',
  G: 'G',
  T: 'T',
  R: 'AG',
  Y: 'CT',
  S: 'CG',
  W: 'AT',
  K: 'GT',
  M: 'AC',
  B: 'CGT',
  D: 'AGT',
  H: 'ACT',
  V: 'ACG',
  N: 'ACGT',
};

const letters = 'ACGTRYSWKMBDHVNacgtryswkmbdhvn';
const partners = 'TGCAYRSWMKVHDBNtgcayrswmkvhdbn';
/** By character code; letters that are no bases stay. */
const PARTNER_CODES = Uint16Array.from({ length: 128 }, (_, code) => code);
for (const [index, letter] of [...letters].entries())
  PARTNER_CODES[letter.charCodeAt(0)] = partners.charCodeAt(index);
/** As many codes as a call may take as arguments. */
const CHUNK = 8192;

function lettersOf(codes: Uint16Array): string {
  let text = '';
  for (let start = 0; start < codes.length; start += CHUNK)
    text += String.fromCharCode(...codes.subarray(start, start + CHUNK));
  return text;
}

function partnerCodes(bases: string): Uint16Array {
  const codes = new Uint16Array(bases.length);
  for (let index = 0; index < bases.length; index += 1) {
    const code = bases.charCodeAt(index);
    codes[index] = PARTNER_CODES[code] ?? code;
  }
  return codes;
}

/** Complement of each letter in place, case kept; a letter that is no base stays. */
export function complement(bases: string): string {
  return lettersOf(partnerCodes(bases));
}

/** The other strand read 5′→3′, case kept. Its own inverse for all 15 letters. */
export function reverseComplement(bases: string): string {
  return lettersOf(partnerCodes(bases).reverse());
}

/** Only A, C, G and T, upper case, and at least one. */
export function isPlainDna(bases: string): boolean {
  return /^[ACGT]+$/.test(bases);
}

/** Rest of a division that is never negative: places on a circle. */
export function wrap(place: number, length: number): number {
  return ((place % length) + length) % length;
}

/**
 * `length` bases read 5′→3′ on a strand from index `start` (of the strand as given, from 0), round the circle if need be.
 * On the reverse strand the reading goes towards lower indices and the letters are complemented.
 */
export function readBases(bases: string, start: number, length: number, strand: Strand): string {
  const size = bases.length;
  if (size === 0 || length <= 0) return '';
  const from = strand === '+' ? wrap(start, size) : wrap(start - length + 1, size);
  let text = bases.slice(from, from + length);
  while (text.length < length) text += bases.slice(0, length - text.length);
  return strand === '+' ? text : reverseComplement(text);
}

/** How many places differ between two texts of equal length. */
export function countDifferences(a: string, b: string): number {
  let differences = 0;
  for (let index = 0; index < a.length; index += 1) if (a[index] !== b[index]) differences += 1;
  return differences;
}
