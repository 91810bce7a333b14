import type { AtomArrays } from './types';

/** Longest distances at which two residues still count as bonded, in ångström [common practice, no source]. */
const PEPTIDE_BOND_ANGSTROM = 2.5;
const ALPHA_CARBONS_ANGSTROM = 4.5;
/** The phosphodiester bond is 1.6 Å; the same allowance as for the peptide bond. */
const PHOSPHODIESTER_ANGSTROM = 2.5;

export interface AtomRange {
  atomStart: number;
  atomCount: number;
}

/** Whether a residue is bonded to the one before it: false at a break of the chain, and when no atom can tell. */
export function isLinked(atoms: AtomArrays, before: AtomRange, after: AtomRange): boolean {
  const peptide = distanceAngstrom(atoms, before, 'C', after, 'N');
  if (peptide !== null) return peptide <= PEPTIDE_BOND_ANGSTROM;
  const nucleic = distanceAngstrom(atoms, before, "O3'", after, 'P');
  if (nucleic !== null) return nucleic <= PHOSPHODIESTER_ANGSTROM;
  const alpha = distanceAngstrom(atoms, before, 'CA', after, 'CA');
  return alpha !== null && alpha <= ALPHA_CARBONS_ANGSTROM;
}

function distanceAngstrom(
  atoms: AtomArrays,
  a: AtomRange,
  aName: string,
  b: AtomRange,
  bName: string,
): number | null {
  const i = find(atoms, a, aName);
  const j = find(atoms, b, bName);
  if (i < 0 || j < 0) return null;
  const { xAngstrom: x, yAngstrom: y, zAngstrom: z } = atoms;
  return Math.hypot((x[i] ?? 0) - (x[j] ?? 0), (y[i] ?? 0) - (y[j] ?? 0), (z[i] ?? 0) - (z[j] ?? 0));
}

function find(atoms: AtomArrays, range: AtomRange, name: string): number {
  for (let at = range.atomStart; at < range.atomStart + range.atomCount; at++) {
    if (atoms.names[at] === name) return at;
  }
  return -1;
}
