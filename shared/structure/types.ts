export interface ChainResidue {
  /** Author number and insertion code, as people read it: `59`, `-4`, `52A`. */
  label: string;
  authorNumber: number;
  insertionCode: string;
  /** Component id of the file: `GLU`, `MSE`. */
  name: string;
  /** One-letter code; of the parent for a modified residue. */
  letter: string;
  /** Three-letter parent of a modified residue. */
  parent?: string;
  /** Range in the model's atom arrays. */
  atomStart: number;
  atomCount: number;
  /** How many atoms of this residue came in more than one alternate position. */
  alternates: number;
  /** Index in the declared sequence, when there is one and the residue could be placed in it. */
  declaredIndex?: number;
}

export interface Ligand {
  name: string;
  label: string;
  /** Range in the model's atom arrays. */
  atomStart: number;
  atomCount: number;
}

export interface SequenceDifference {
  label: string;
  residueName: string;
  databaseResidue: string;
  databaseNumber: string;
  comment: string;
}

export interface DatabaseReference {
  begin: string;
  end: string;
  database: string;
  accession: string;
  databaseBegin: number;
  databaseEnd: number;
}

export interface Chain {
  /** Author chain id; a blank one stays `" "`. */
  id: string;
  labelIds: string[];
  kind: 'protein' | 'nucleic' | 'other';
  /** Declared sequence in one-letter codes (modified residues by parent, unknown X), or null. */
  declared: string | null;
  observed: string;
  residues: ChainResidue[];
  ligands: Ligand[];
  waters: number;
  /** Author labels of declared residues without coordinates. */
  missing: string[];
  differences: SequenceDifference[];
  references: DatabaseReference[];
}

/**
 * Atoms of one model as parallel arrays; lengths in ångström. They stand chain by chain in the order of `chains`;
 * within a chain, residues and ligands in file order, then waters.
 */
export interface AtomArrays {
  count: number;
  xAngstrom: Float32Array;
  yAngstrom: Float32Array;
  zAngstrom: Float32Array;
  /** Atom name without blanks. */
  names: string[];
  elements: string[];
}

export interface StructureModel {
  format: 'pdb' | 'mmcif';
  title: string;
  /** How many models the file holds. */
  modelCount: number;
  /** The model read, as numbered in the file. */
  modelNumber: number;
  chains: Chain[];
  atoms: AtomArrays;
}
