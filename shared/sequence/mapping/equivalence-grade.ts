import { BLOSUM62_LETTERS, BLOSUM62_ROWS } from './blosum62.data';

export type EquivalenceGrade = 'strong' | 'good' | 'fair' | 'weak' | 'none';
export type LetterRelation = 'same' | 'similar' | 'other';

/** Above this share of gaps a column says little about who corresponds to whom (handbook 8.4, common practice). */
export const GAPPED_COLUMN_SHARE = 0.3;

/**
 * How two residue letters relate: the same, similar (BLOSUM62 above zero; Henikoff & Henikoff 1992), or other.
 * Letters in any case; a letter outside the matrix is never the same as another, nor similar.
 */
export function letterRelation(one: string, other: string): LetterRelation {
  const a = BLOSUM62_LETTERS.indexOf(one.toUpperCase());
  const b = BLOSUM62_LETTERS.indexOf(other.toUpperCase());
  if (a < 0 || b < 0) return 'other';
  if (a === b) return one.toUpperCase() === 'X' ? 'other' : 'same';
  return (BLOSUM62_ROWS[a]?.[b] ?? 0) > 0 ? 'similar' : 'other';
}

export interface EquivalenceFacts {
  relation: LetterRelation;
  /** Share of the column's rows that have a gap there, 0 to 1. */
  gapShare: number;
  /** One of the two stands at the edge of a gap in its row. */
  besideGap: boolean;
}

/** Grade of an equivalence through one alignment column (handbook 8.4, common practice, no source). */
export function gradeEquivalence({ relation, gapShare, besideGap }: EquivalenceFacts): EquivalenceGrade {
  if (besideGap || gapShare > GAPPED_COLUMN_SHARE) return 'weak';
  if (relation === 'same') return 'strong';
  return relation === 'similar' ? 'good' : 'fair';
}
