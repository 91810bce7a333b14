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
const PARTNER_CODES = Uint8Array.from({ length: 128 }, (_, code) => code);
for (const [index, letter] of [...letters].entries())
  PARTNER_CODES[letter.charCodeAt(0)] = partners.charCodeAt(index);
function partnerOf(letter: string): string {
  const code = PARTNER_CODES[letter.charCodeAt(0)];
  return code === undefined ? letter : String.fromCharCode(code);
}
const ascii = new TextDecoder('latin1');

/** Complement of each letter in place, case kept; a letter that is no base stays. */
export function complement(bases: string): string {
  const codes = new Uint8Array(bases.length);
  for (let index = 0; index < bases.length; index += 1) {
    const code = PARTNER_CODES[bases.charCodeAt(index)];
    // Text that is no DNA at all goes the slow way, letter by letter.
    if (code === undefined) return [...bases].map(partnerOf).join('');
    codes[index] = code;
  }
  return ascii.decode(codes);
}

/** The other strand read 5′→3′, case kept. Its own inverse for all 15 letters. */
export function reverseComplement(bases: string): string {
  const last = bases.length - 1;
  const codes = new Uint8Array(bases.length);
  for (let index = 0; index <= last; index += 1) {
    const code = PARTNER_CODES[bases.charCodeAt(last - index)];
    if (code === undefined) return [...bases].reverse().map(partnerOf).join('');
    codes[index] = code;
  }
  return ascii.decode(codes);
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
