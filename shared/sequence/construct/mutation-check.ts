import { codeOfLetter } from '../alphabet';
import { labelOfResidue, residueOfLabel, type Numbering } from '../numbering/numbering';
import type { Issue, ParseResult } from '../parse-result';
import { residueIndex, type ResidueIndex } from '../positions';
import type { MutantRequest, Substitution } from './mutation';

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
  numbering: Numbering,
): { issue: Issue; suggestions: string[] } {
  const { from, to, label, short } = substitution;
  const stands = protein.charAt(place);
  const labels = near(protein, place, from).flatMap(
    (index) => labelOfResidue(numbering, residueIndex(index)) ?? [],
  );
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
export function checkMutant(request: MutantRequest, protein: string, numbering: Numbering): MutantCheck {
  const issues: Issue[] = [];
  const suggestions: string[] = [];
  const changes: ResidueChange[] = [];
  for (const substitution of request.substitutions) {
    const { from, to, label, short } = substitution;
    const index = residueOfLabel(numbering, label);
    if (index === null) {
      const first = labelOfResidue(numbering, residueIndex(0));
      const last = labelOfResidue(numbering, residueIndex(protein.length - 1));
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
