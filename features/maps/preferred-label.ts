import type { Protein } from '@/shared/contracts/families';
import { labelOfResidue } from '@/shared/sequence/numbering/numbering';
import { residueIndex } from '@/shared/sequence/positions';

/** What a residue of a protein is called in the numbering shown first; null where that gives it no label. */
export function preferredLabel(
  protein: Pick<Protein, 'numberings' | 'preferredNumbering'>,
  index: number,
): { label: string; numbering: string } | null {
  const named = protein.numberings.find(({ name }) => name === protein.preferredNumbering);
  if (!named) return null;
  const segments = named.segments.map((segment) => ({
    ...segment,
    residueIndex: residueIndex(segment.residueIndex),
  }));
  const label = labelOfResidue({ segments }, residueIndex(index));
  return label === null ? null : { label, numbering: named.name };
}
