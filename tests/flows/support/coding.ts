// Reads DNA back with a published table, apart from the product's own code.
import { readFixtureJson, readFixtureText } from '@/tests/support/read-fixture';

/** Amino acids of a coding sequence, one letter each, stops as `*`. Source: NCBI table 11 (genetic-codes.json). */
export function aminoAcidsOf(dna: string): string {
  const { codes } = readFixtureJson<{ codes: Record<string, { aminoAcids: string }> }>('genetic-codes.json');
  const table = codes['11']?.aminoAcids ?? '';
  return Array.from({ length: Math.floor(dna.length / 3) }, (_, codon) => {
    const [one = 0, two = 0, three = 0] = [0, 1, 2].map((at) => 'TCAG'.indexOf(dna.charAt(codon * 3 + at)));
    return table.charAt(one * 16 + two * 4 + three);
  }).join('');
}

const opposite = (dna: string): string =>
  [...dna]
    .reverse()
    .map((base) => 'TGCA'.charAt('ACGT'.indexOf(base)))
    .join('');

/**
 * What a complementary pair makes of a template: it lies where it differs in one codon only (base from zero), and what
 * it covers becomes what it says.
 */
export function productOfPair(
  template: string,
  forward: string,
  reverse: string,
  codonStart: number,
): string {
  expect(opposite(reverse)).toBe(forward);
  const inCodon = (base: number) => base >= codonStart && base < codonStart + 3;
  const places = Array.from({ length: forward.length }, (_, back) => codonStart - back).filter((start) =>
    [...forward].every((base, at) => inCodon(start + at) || template.charAt(start + at) === base),
  );
  expect(places).toHaveLength(1);
  const [start = 0] = places;
  return template.slice(0, start) + forward + template.slice(start + forward.length);
}

/** Residues of a row of an aligned file, without gaps. */
export function rowOfFile(file: string, row: string): string {
  const record = readFixtureText(file)
    .split('>')
    .find((one) => one.startsWith(row));
  return (record ?? '').split('\n').slice(1).join('').replaceAll('-', '');
}
