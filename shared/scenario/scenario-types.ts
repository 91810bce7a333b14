import type { BaseIndex, ColumnIndex, ResidueIndex } from '../sequence/positions';

/** The four families the demo has alignments of, by their names in an F-type motor. */
export type ScenarioFamily = 'c' | 'a' | 'β' | 'γ';
export type ScenarioRole = 'lead' | 'curator' | 'contributor' | 'reader';

/** Everything the demo loads. All people, organisms, sequences, references and coordinates are invented. */
export interface Scenario {
  team: { name: string };
  project: { name: string; motorKind: 'F'; readersMayComment: boolean };
  people: ScenarioPerson[];
  /** Organism that the structure and the construct are of. */
  modelOrganism: string;
  organisms: string[];
  alignments: ScenarioAlignment[];
  structure: ScenarioStructure;
  construct: ScenarioConstruct;
  story: ScenarioStory;
}

export interface ScenarioPerson {
  /** Short handle that the story uses for its authors. */
  key: string;
  name: string;
  email: string;
  role: ScenarioRole;
  /** Leads the team as well as having the project role. */
  teamLead: boolean;
  /** Not of the team: an outside collaborator. */
  outside: boolean;
}

/** A residue of a protein; the protein is named by its family and organism (one protein each). */
export interface ScenarioResidue {
  family: ScenarioFamily;
  organism: string;
  index: ResidueIndex;
}

export interface ScenarioAlignment {
  family: ScenarioFamily;
  part: 'rotor' | 'stator' | 'catalytic head';
  fileName: string;
  /** The aligned FASTA file. */
  text: string;
  columnCount: number;
  rows: ScenarioAlignmentRow[];
  /** Column of each named site: `carboxylate`, `essential arginine` … */
  sites: Record<string, ColumnIndex>;
}

export interface ScenarioAlignmentRow {
  organism: string;
  /** Name in the file: the organism with an underscore. */
  name: string;
  description: string;
  /** Aligned text, as wide as the alignment. */
  text: string;
  residues: string;
  /** True column of each residue, by residue index. */
  columns: ColumnIndex[];
}

export interface ScenarioStructure {
  fileName: string;
  title: string;
  /** The PDB-format file. */
  text: string;
  chains: ScenarioChain[];
  /** Axis of the ring: unit vector from the ring towards the head, and a point on it, in ångström. */
  axis: { direction: Xyz; point: Xyz };
}

export type Xyz = readonly [number, number, number];

export interface ScenarioChain {
  id: string;
  family: ScenarioFamily;
  organism: string;
  /** Place in the ring, from 1 in the direction of synthesis; null outside the ring. */
  copy: number | null;
  /** Degrees about the axis from copy 1; null outside the ring. */
  angleDegrees: number | null;
  /** Every declared residue in order. */
  residues: ScenarioChainResidue[];
}

export interface ScenarioChainResidue {
  /** Residue of the protein that this is. */
  index: ResidueIndex;
  authorNumber: number;
  letter: string;
  /** False: declared and listed as missing, without coordinates. */
  observed: boolean;
}

export interface ScenarioConstruct {
  name: string;
  fileName: string;
  /** FASTA file with one DNA record. */
  text: string;
  bases: string;
  circular: boolean;
  codingStart: BaseIndex;
  /** In bases, the stop codon counted. */
  codingLength: number;
  geneticCode: number;
  family: ScenarioFamily;
  organism: string;
  /** Protein it encodes with its tag, without the stop. */
  encoded: string;
  /** Each codon in order, the stop last. */
  codons: ScenarioCodon[];
}

export interface ScenarioCodon {
  start: BaseIndex;
  bases: string;
  /** One letter, or `*`. */
  letter: string;
  /** Residue of the wild-type protein; null in the tag and at the stop. */
  index: ResidueIndex | null;
}

export interface ScenarioStory {
  numberings: ScenarioNumbering[];
  annotations: ScenarioAnnotation[];
  threads: ScenarioThread[];
  mutants: ScenarioMutant[];
}

/** Offset numbering of one protein: label = index + 1 + offset. */
export interface ScenarioNumbering {
  family: ScenarioFamily;
  organism: string;
  name: string;
  offset: number;
}

export type ScenarioAnnotationKind =
  | 'ion site'
  | 'facing charge'
  | 'nucleotide site'
  | 'contact'
  | 'hinge or grip'
  | 'path'
  | 'modification'
  | 'caution'
  | 'note';

export type ScenarioEvidenceKind =
  | 'coordinates'
  | 'density'
  | 'mutant'
  | 'cross-link or label'
  | 'single-molecule rotation'
  | 'conservation'
  | 'calculation'
  | 'publication'
  | 'other';

export interface ScenarioAnnotation {
  author: string;
  /** One residue, or two for a statement on a pair. */
  residues: ScenarioResidue[];
  kind: ScenarioAnnotationKind;
  /** Markdown. */
  text: string;
  evidence: { kind: ScenarioEvidenceKind; reference: string }[];
  confidence: 'low' | 'medium' | 'high';
  status: 'proposed' | 'accepted' | 'contested' | 'retired';
  /** Who took it to that status, and why (contested and retired have a reason). */
  decidedBy?: string;
  reason?: string;
}

export interface ScenarioThread {
  residue: ScenarioResidue;
  messages: ScenarioMessage[];
}

export interface ScenarioMessage {
  author: string;
  /** Markdown, with residues written so that they can be read as addresses. */
  text: string;
}

export interface ScenarioMutant {
  author: string;
  mutations: { residue: ScenarioResidue; oldLetter: string; newLetter: string }[];
  reason: string;
}
