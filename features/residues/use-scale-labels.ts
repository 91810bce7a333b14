import { useMemo } from 'react';
import type { ResidueLabel } from '@/shared/contracts/common';
import { labelsOf } from '@/shared/sequence/numbering/numbering';
import { residueIndex } from '@/shared/sequence/positions';
import { useProtein } from '@/features/families';

/** Labels along the chain in the numbering that the plate shows, so that scale and plate never disagree. */
export function useScaleLabels(projectId: string, residue: ResidueLabel): (index: number) => string {
  const { data: protein } = useProtein(projectId, residue.proteinId);
  return useMemo(() => {
    const numbering = protein?.numberings.find(({ name }) => name === residue.numbering);
    const segments = (numbering?.segments ?? []).map((segment) => ({
      ...segment,
      residueIndex: residueIndex(segment.residueIndex),
    }));
    const labels = protein ? labelsOf({ segments }, protein.length) : [];
    return (index) => (index === residue.residueIndex ? residue.label : (labels[index] ?? ''));
  }, [protein, residue.numbering, residue.residueIndex, residue.label]);
}
