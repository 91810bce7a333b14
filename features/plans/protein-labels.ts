import type { Protein } from '@/shared/contracts/families';
import { labelsOf, type Numbering } from '@/shared/sequence/numbering/numbering';
import { residueIndex } from '@/shared/sequence/positions';

type Numbered = Pick<Protein, 'numberings' | 'preferredNumbering' | 'length'>;

/** The numbering in which people name residues of a protein. */
export function preferredNumberingOf(protein: Numbered): Numbering {
  const preferred = protein.numberings.find(({ name }) => name === protein.preferredNumbering);
  return {
    segments: (preferred?.segments ?? []).map((segment) => ({
      ...segment,
      residueIndex: residueIndex(segment.residueIndex),
    })),
  };
}

/** Labels in that numbering by residue index, null where a residue has none. */
export function preferredLabelsOf(protein: Numbered): (string | null)[] {
  return labelsOf(preferredNumberingOf(protein), protein.length);
}
