import { AMINO_ACIDS, type AminoAcid, type ResidueChemistry } from './alphabet.data';

export { AMINO_ACIDS };
export type { AminoAcid, ResidueChemistry };

const byLetter = new Map(AMINO_ACIDS.map((acid) => [acid.letter, acid]));
const byCode = new Map(AMINO_ACIDS.map((acid) => [acid.code.toUpperCase(), acid]));

/** The amino acid of a one-letter code in either case, or undefined. */
export function aminoAcid(letter: string): AminoAcid | undefined {
  return byLetter.get(letter.toUpperCase());
}

/** The one-letter code of a three-letter code in any case (`Glu`, `GLU`), or undefined. */
export function letterOfCode(code: string): string | undefined {
  return byCode.get(code.toUpperCase())?.letter;
}

/** `Glu` for E; `Ter` for the stop mark; the letter itself when it is none. */
export function codeOfLetter(letter: string): string {
  return letter === '*' ? 'Ter' : (aminoAcid(letter)?.code ?? letter);
}

/** `Glutamate` for E; the letter itself when it is none. */
export function nameOfLetter(letter: string): string {
  return letter === '*' ? 'Stop' : (aminoAcid(letter)?.name ?? letter);
}

/** The 20 standard letters. */
export const STANDARD_LETTERS = 'ARNDCQEGHILKMFPSTWYV';

/** Gap characters a row may hold: `-`, `.` (Stockholm and insert padding) and `~` (outer gap of some exports). */
export function isGap(character: string): boolean {
  return character === '-' || character === '.' || character === '~';
}

/** B, Z, J and X: neither identical nor a mismatch, and out of the denominator of an identity. */
export function isAmbiguous(letter: string): boolean {
  return aminoAcid(letter)?.ambiguous ?? false;
}

/** How two aligned letters compare, upper-cased; `undetermined` when one is B, Z, J or X. */
export function compareLetters(a: string, b: string): 'identical' | 'different' | 'undetermined' {
  if (isAmbiguous(a) || isAmbiguous(b)) return 'undetermined';
  return a.toUpperCase() === b.toUpperCase() ? 'identical' : 'different';
}
