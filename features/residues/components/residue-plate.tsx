import type { ResidueLabel } from '@/shared/contracts/common';
import { Plate, plateWords, type EvidenceEdge, type GradeName, type PlateSize } from '@/components/residue';
import { residuePath } from '@/client/paths';

interface ResiduePlateProps {
  projectId: string;
  residue: ResidueLabel;
  size?: PlateSize;
  evidence?: EvidenceEdge;
  grade?: GradeName;
  becomes?: string;
}

/** A residue's plate that leads to its page. */
export function ResiduePlate({ projectId, residue, ...rest }: ResiduePlateProps) {
  return <Plate {...rest} {...plateWords(residue)} href={residuePath(projectId, residue)} />;
}
