import { GENETIC_CODE_TABLES, type GeneticCodeTable } from './genetic-code.data';

/** Numbers of NCBI's translation tables. */
export const GENETIC_CODE_IDS = [1, 2, 3, 4, 5, 11] as const;
export type GeneticCodeId = (typeof GENETIC_CODE_IDS)[number];

const BASE_ORDER = 'TCAG';
const tables = new Map<number, GeneticCodeTable>(GENETIC_CODE_TABLES.map((table) => [table.id, table]));

export function isGeneticCodeId(id: number): id is GeneticCodeId {
  return tables.has(id);
}

/** Name of a table as people read it. */
export function geneticCodeName(id: GeneticCodeId): string {
  return tables.get(id)?.name ?? '';
}

/**
 * The amino acid of a codon (upper case, T not U) with its normal meaning, without a rule for start codons; stop as `*`,
 * a codon with any letter besides A, C, G, T as X.
 */
export function translateCodon(codon: string, id: GeneticCodeId): string {
  const first = BASE_ORDER.indexOf(codon.charAt(0));
  const second = BASE_ORDER.indexOf(codon.charAt(1));
  const third = BASE_ORDER.indexOf(codon.charAt(2));
  if (codon.length !== 3 || first < 0 || second < 0 || third < 0) return 'X';
  return tables.get(id)?.aminoAcids.charAt(first * 16 + second * 4 + third) ?? 'X';
}

/**
 * Literal translation from the first base on: whole codons only, stops as `*`, ambiguous codons X, no rule for start codons.
 * Bases upper case, T not U.
 */
export function translate(bases: string, id: GeneticCodeId): string {
  let protein = '';
  for (let index = 0; index + 3 <= bases.length; index += 3)
    protein += translateCodon(bases.slice(index, index + 3), id);
  return protein;
}

export function isStartCodon(codon: string, id: GeneticCodeId): boolean {
  return tables.get(id)?.starts.includes(codon) ?? false;
}

/** All codons of an amino acid (or of `*`), in the order T, C, A, G. */
export function codonsOf(letter: string, id: GeneticCodeId): string[] {
  const codons: string[] = [];
  for (const first of BASE_ORDER)
    for (const second of BASE_ORDER)
      for (const third of BASE_ORDER) {
        const codon = first + second + third;
        if (translateCodon(codon, id) === letter) codons.push(codon);
      }
  return codons;
}
