/**
 * Modified amino acid (component id) → component id of its parent: the short table that comes before the long one.
 * Source: public chemical component dictionary as in Biopython 1.80; the last line holds names that simulation
 * programs give to protonation states [from memory].
 */
export const COMMON_PARENTS: Readonly<Record<string, string>> = {
  ...parents('MET', 'MSE FME'),
  ...parents('SER', 'SEP SAC OAS'),
  ...parents('THR', 'TPO'),
  ...parents('TYR', 'PTR'),
  ...parents('CYS', 'CSO CSD CME OCS CAS'),
  ...parents('LYS', 'M3L MLY MLZ ALY KCX LLP'),
  ...parents('GLN', 'PCA'),
  ...parents('PRO', 'HYP'),
  ...parents('GLU', 'CGU'),
  ...parents('HIS', 'HIC NEP'),
  ...parents('ALA', 'ABA'),
  ...parents('ASP', 'PHD BFD'),
  ...parents('LEU', 'NLE MLE'),
  ...parents('VAL', 'MVA'),
  ...parents('HIS', 'HID HIE HIP HSD HSE HSP'),
  ...parents('CYS', 'CYX CYM'),
  ...parents('ASP', 'ASH'),
  ...parents('GLU', 'GLH'),
  ...parents('LYS', 'LYN'),
};

/** Nucleotide (component id) → one-letter code, as printed in a sequence. Source: PDB format 3.3 [from memory]. */
export const NUCLEOTIDE_LETTERS: Readonly<Record<string, string>> = {
  A: 'A',
  C: 'C',
  G: 'G',
  U: 'U',
  T: 'T',
  I: 'I',
  N: 'N',
  DA: 'A',
  DC: 'C',
  DG: 'G',
  DT: 'T',
  DU: 'U',
  DI: 'I',
  DN: 'N',
};

/** Names of water. HOH and DOD: PDB format 3.3; the others are written by simulation programs [from memory]. */
export const WATER_NAMES: ReadonlySet<string> = new Set(['HOH', 'DOD', 'WAT', 'H2O', 'TIP', 'TIP3', 'SOL']);

/** Groups that close a chain's ends and carry no residue: acetyl and amide. Source: PDB format 3.3 [from memory]. */
export const CAP_NAMES: ReadonlySet<string> = new Set(['ACE', 'NH2']);

function parents(parent: string, names: string): Record<string, string> {
  return Object.fromEntries(names.split(' ').map((name) => [name, parent]));
}
