import type { DatabaseReference, SequenceDifference } from '../types';

/** What `writePdb` writes: plain data, coordinates in ångström, one model. */
export interface PdbWriteInput {
  title: string;
  chains: PdbWriteChain[];
  /** Free text, written as REMARK 999. */
  remarks?: string[];
}

export interface PdbWriteChain {
  /** One character. */
  id: string;
  /** Component ids of the whole declared polymer; none, no SEQRES. */
  declared: string[];
  residues: PdbWriteResidue[];
  /** Ligands and waters, after the end of the polymer. */
  ligands?: PdbWriteResidue[];
  dbref?: DatabaseReference[];
  differences?: SequenceDifference[];
  missing?: { name: string; number: number; insertionCode?: string }[];
}

export interface PdbWriteResidue {
  number: number;
  insertionCode?: string;
  /** Component id of up to three characters. */
  name: string;
  /** Written as HETATM; a polymer residue that is a modified one gets a MODRES too. */
  hetero?: boolean;
  /** Component id of the parent, where the common tables do not know it. */
  parent?: string;
  atoms: PdbWriteAtom[];
}

export interface PdbWriteAtom {
  name: string;
  element: string;
  x: number;
  y: number;
  z: number;
  /** 1 when left out. */
  occupancy?: number;
  /** B factor in Å², or a model's confidence; 0 when left out. */
  bFactor?: number;
  alternate?: string;
}
