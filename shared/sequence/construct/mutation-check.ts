import { codeOfLetter } from '../alphabet';
import type { Issue, ParseResult } from '../parse-result';
import { residueIndex, type ResidueIndex } from '../positions';
import type { MutantRequest, Substitution } from './mutation';

/** How a protein's residues are called. A label may be absent, never double. */
export interface NumberingLookup {
  indexOf(label: string): ResidueIndex | null;
  labelOf(index: ResidueIndex): string | null;
}

/** Numbering with a constant offset: label = index from 1 + offset. Only labels inside the protein are known. */
export function offsetNumbering(length: number, offset = 0): NumberingLookup {
  return {
    indexOf: (label) => {
      if (!/^-?\d+$/.test(label)) return null;
      const index = Number(label) - offset - 1;
      return index >= 0 && index < length ? residueIndex(index) : null;
    },
    labelOf: (index) => (index >= 0 && index < length ? String(index + 1 + offset) : null),
  };
}

export interface ResidueChange {
  residueIndex: ResidueIndex;
  label: string;
  from: string;
  to: string;
}

export interface CheckedMutant {
  asked: string;
  changes: ResidueChange[];
}

export interface MutantCheck extends ParseResult<CheckedMutant> {
  /** Exchanges that would fit, nearest first, when a letter stands elsewhere: `D61N` for `D59N`. */
  suggestions: string[];
}

/** How far a letter is looked for on both sides, and how many places are named (choice, no source). */
export const NEAR_RESIDUES = 20;
export const NEAR_PLACES = 3;

function near(protein: string, place: number, letter: string): number[] {
  const places: number[] = [];
  for (let distance = 1; distance <= NEAR_RESIDUES; distance += 1)
    for (const index of [place - distance, place + distance])
      if (index >= 0 && protein.charAt(index) === letter) places.push(index);
  return places.slice(0, NEAR_PLACES);
}

function wrongLetter(
  substitution: Substitution,
  protein: string,
  place: ResidueIndex,
  numbering: NumberingLookup,
): { issue: Issue; suggestions: string[] } {
  const { from, to, label, short } = substitution;
  const stands = protein.charAt(place);
  const labels = near(protein, place, from).flatMap((index) => numbering.labelOf(residueIndex(index)) ?? []);
  const wanted = `${codeOfLetter(from)} (${from})`;
  const where =
    labels.length > 0
      ? `The nearest ${from} stands at ${labels.join(', ')}.`
      : `No ${from} stands within ${NEAR_RESIDUES} residues.`;
  return {
    issue: {
      code: 'mutation-letter-differs',
      severity: 'error',
      residue: label,
      message: `${short}: at ${label} stands ${codeOfLetter(stands)} (${stands}), not ${wanted}. ${where}`,
    },
    suggestions: labels.map((other) => `${from}${other}${to}`),
  };
}

/**
 * Holds a mutant against a protein in a numbering. Errors: `mutation-label-unknown`, `mutation-letter-differs` (what stands there
 * and where the letter stands near). Warning: `mutation-start-codon` (the first residue).
 */
export function checkMutant(
  request: MutantRequest,
  protein: string,
  numbering: NumberingLookup,
): MutantCheck {
  const issues: Issue[] = [];
  const suggestions: string[] = [];
  const changes: ResidueChange[] = [];
  for (const substitution of request.substitutions) {
    const { from, to, label, short } = substitution;
    const index = numbering.indexOf(label);
    if (index === null) {
      const first = numbering.labelOf(residueIndex(0));
      const last = numbering.labelOf(residueIndex(protein.length - 1));
      const range = first !== null && last !== null ? ` It runs from ${first} to ${last}.` : '';
      issues.push({
        code: 'mutation-label-unknown',
        severity: 'error',
        residue: label,
        message: `${short}: there is no residue ${label} in this numbering.${range}`,
      });
    } else if (protein.charAt(index) !== from) {
      const wrong = wrongLetter(substitution, protein, index, numbering);
      issues.push(wrong.issue);
      suggestions.push(...wrong.suggestions);
    } else changes.push({ residueIndex: index, label, from, to });
    if (index === 0)
      issues.push({
        code: 'mutation-start-codon',
        severity: 'warning',
        residue: label,
        message: `${short} changes the first residue; the start codon may be lost.`,
      });
  }
  const failed = issues.some(({ severity }) => severity === 'error');
  return { value: failed ? null : { asked: request.asked, changes }, issues, suggestions };
}
