import type { ResidueLabel } from '@/shared/contracts/common';
import { aminoAcid, type ResidueChemistry } from '@/shared/sequence/alphabet';

export type EvidenceEdge = 'observed' | 'equivalence' | 'predicted';
export type GradeName = 'none' | 'weak' | 'fair' | 'good' | 'strong';

export const evidenceWords: Record<EvidenceEdge, string> = {
  observed: 'observed',
  equivalence: 'by equivalence',
  predicted: 'predicted',
};

export interface ResidueWords {
  /** The family's letter or name as people write it: c, β, gamma. */
  family: string;
  /** One-letter code of the residue that stands there. */
  code: string;
  /** The label in the numbering shown, a string because of insertions (52A) and negative numbers. */
  number: string;
  /** One-letter code it is changed to: E59Q has code E, number 59, becomes Q. */
  becomes?: string;
  numbering?: string;
  organism?: string;
  evidence?: EvidenceEdge;
  grade?: GradeName;
  struck?: boolean;
}

/** The words of a plate for a residue as the server names it. */
export function plateWords({ family, part, letter, label, numbering, organism }: ResidueLabel) {
  return { family, part, code: letter, number: label, numbering, organism };
}

export interface AminoAcidWords {
  /** `glutamate` */
  name: string;
  /** `Glu` */
  threeLetter: string;
  /** Null where the letter stands for more than one residue, or for none. */
  chemistry: ResidueChemistry | null;
}

export function wordsForCode(code: string): AminoAcidWords {
  const acid = aminoAcid(code);
  if (!acid) return { name: `residue ${code}`, threeLetter: code, chemistry: null };
  return { name: acid.name.toLowerCase(), threeLetter: acid.code, chemistry: acid.chemistry };
}

/** `E59`, or `E59Q` for a planned change. */
export const shortLabel = (residue: Pick<ResidueWords, 'code' | 'number' | 'becomes'>): string =>
  `${residue.code}${residue.number}${residue.becomes ?? ''}`;

/** What a screen reader says: "c, glutamate 59, mature numbering, Orvella tarda, by equivalence, grade good". */
export function spokenResidue(residue: ResidueWords): string {
  const name = wordsForCode(residue.code).name;
  const parts = [residue.family, `${name} ${residue.number}`];
  if (residue.becomes) parts[1] += ` to ${wordsForCode(residue.becomes).name}`;
  if (residue.numbering) parts.push(`${residue.numbering} numbering`);
  if (residue.organism) parts.push(residue.organism);
  if (residue.evidence && residue.evidence !== 'observed') parts.push(evidenceWords[residue.evidence]);
  if (residue.grade) parts.push(`grade ${residue.grade}`);
  if (residue.struck) parts.push('not in this revision');
  return parts.join(', ');
}
