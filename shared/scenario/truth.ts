import { residueIndex, type ResidueIndex } from '../sequence/positions';
import { modelOrganism } from './organisms.data';
import type {
  ScenarioAlignment,
  ScenarioAlignmentRow,
  ScenarioFamily,
  ScenarioResidue,
} from './scenario-types';

/** The row of an organism in the alignment of a family. */
export function findRow(
  alignments: readonly ScenarioAlignment[],
  family: ScenarioFamily,
  organism: string,
): ScenarioAlignmentRow | undefined {
  const alignment = alignments.find((candidate) => candidate.family === family);
  return alignment?.rows.find((row) => row.organism === organism);
}

/** The residue that an organism has in the column of a named site, or null. */
export function residueAtSite(
  alignments: readonly ScenarioAlignment[],
  family: ScenarioFamily,
  site: string,
  organism: string = modelOrganism,
): ScenarioResidue | null {
  const column = alignments.find((candidate) => candidate.family === family)?.sites[site];
  const row = findRow(alignments, family, organism);
  const index = column === undefined ? -1 : (row?.columns.indexOf(column) ?? -1);
  return index < 0 ? null : { family, organism, index: residueIndex(index) };
}

/** One-letter code of a residue. */
export function letterOf(alignments: readonly ScenarioAlignment[], residue: ScenarioResidue): string {
  return findRow(alignments, residue.family, residue.organism)?.residues.charAt(residue.index) ?? '';
}

/** `cE64`: family, letter, and number in the protein's own numbering, or shifted by the offset of another. */
export function writeResidue(
  alignments: readonly ScenarioAlignment[],
  residue: ScenarioResidue,
  offset = 0,
): string {
  return `${residue.family}${letterOf(alignments, residue)}${numberOf(residue.index) + offset}`;
}

const numberOf = (index: ResidueIndex): number => index + 1;
