import type {
  Family as FamilyContract,
  Numbering as NumberingContract,
  Protein as ProteinContract,
  ProteinBrief,
} from '../../../shared/contracts';
import type { Family } from './family.entity';
import type { NumberingSegment } from './numbering-segment.entity';
import type { Numbering } from './numbering.entity';
import type { Protein } from './protein.entity';

/** The numbering every protein is born with, shown where no other is preferred. */
export const bornNumbering = 'sequence';

export function presentFamily(family: Family, proteinCount: number): FamilyContract {
  const { id, name, aliases, description, part, catalytic, sort, referenceAlignmentId, version } = family;
  return {
    id,
    name,
    aliases,
    description,
    part,
    catalytic,
    sort,
    proteinCount,
    referenceAlignmentId,
    version,
  };
}

export function presentProteinBrief(protein: Protein): ProteinBrief {
  const { id, familyId, organism, name, residues, version } = protein;
  return { id, familyId, organism, name, length: residues.length, version };
}

export function presentNumbering(
  numbering: Numbering,
  segments: readonly NumberingSegment[],
): NumberingContract {
  const { id, name, kind } = numbering;
  return {
    id,
    name,
    kind,
    segments: segments.map(({ residueIndex, length, firstNumber, suffix }) => ({
      residueIndex,
      length,
      firstNumber,
      suffix,
    })),
  };
}

export function presentProtein(
  protein: Protein,
  family: Family,
  numberings: readonly NumberingContract[],
): ProteinContract {
  return {
    ...presentProteinBrief(protein),
    residues: protein.residues,
    numberings: [...numberings],
    preferredNumbering: preferredNumbering(
      family,
      numberings.map((numbering) => numbering.name),
    ),
  };
}

/** The numbering shown first on a protein: its family's choice when the protein has it, else the one it was born with. */
export function preferredNumbering(family: Family, names: readonly string[]): string {
  const chosen = family.preferredNumbering;
  return chosen !== null && names.includes(chosen) ? chosen : bornNumbering;
}
