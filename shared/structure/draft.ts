import type { AtomTable } from './atom-table';
import type { DatabaseReference, SequenceDifference } from './types';

/** A group of atoms as a file gives it, before it is known to be a residue, a ligand or water. */
export interface DraftResidue {
  chain: number;
  authorNumber: number;
  insertionCode: string;
  name: string;
  /** Written as HETATM. */
  hetero: boolean;
  /** 0 before the end (TER) of its chain's polymer; counts the ends before it. */
  segment: number;
  /** Where it begins in the file, from 1. */
  line: number;
  atomCount: number;
  /** Atoms given in more than one position. */
  alternates: number;
  /** An atom with an alternate mark was read. */
  marked: boolean;
  /** First line that gives an atom of occupancy 0; 0 when there is none. */
  zeroOccupancyLine: number;
}

export interface DraftChain {
  id: string;
  labelIds: string[];
  /** Indices of its residues in file order, waters left out. */
  residues: number[];
  waters: number[];
  /** Ends of the polymer (TER) met so far. */
  segment: number;
}

export interface MissingResidue {
  name: string;
  authorNumber: number;
  insertionCode: string;
  /** Models that lack it; all of them when undefined. */
  models?: { first: number; last: number };
}

/** What a file states about its chains beside the coordinates, by author chain id. */
export interface Declarations {
  title: string;
  /** Component ids of the whole declared polymer. */
  sequences: Map<string, string[]>;
  missing: Map<string, MissingResidue[]>;
  differences: Map<string, SequenceDifference[]>;
  references: Map<string, DatabaseReference[]>;
  /** Parent component that the file states for a component of a chain, if it does; without a label, anywhere. */
  parentOf(name: string, chain?: string, label?: string): string | undefined;
}

/** Everything that one model of a file gives, whatever the format it was read from. */
export interface Draft {
  format: 'pdb' | 'mmcif';
  modelCount: number;
  modelNumber: number;
  chains: DraftChain[];
  residues: DraftResidue[];
  atoms: AtomTable;
  declarations: Declarations;
}

/** `52A`, `-4`: author number and insertion code as people read them. */
export function residueLabel(authorNumber: number, insertionCode: string): string {
  return `${authorNumber}${insertionCode}`;
}
