import type { ChainIndex, ResidueIndex } from '../positions';

/** An observed residue of a chain, as the coordinate readers give it. */
export interface MappableResidue {
  /** Author number and insertion code. */
  label: string;
  letter: string;
  /** Three-letter parent, when the residue is a modified one. */
  parent?: string;
  /** Place in the chain's declared sequence, from 0, where known. */
  declaredIndex?: number;
}

/** What the file itself says about a residue that differs from its database entry. */
export interface MappableDifference {
  label: string;
  comment: string;
}

export interface MappableChain {
  id: string;
  /** Observed residues in file order; index = ChainIndex. */
  residues: readonly MappableResidue[];
  differences: readonly MappableDifference[];
}

export interface CandidateProtein {
  id: string;
  /** Name for messages. */
  name: string;
  /** Family id or name; candidates of one family are rivals of each other, not of the family. */
  family: string;
  /** Upper case, ungapped. */
  residues: string;
}

/** A run of chain residues beside protein residues, without a gap on either side and without a chain break. */
export interface MapSegment {
  chainStart: ChainIndex;
  proteinStart: ResidueIndex;
  length: number;
}

/**
 * - `mismatch`: another letter; `engineered`: another letter, and the file says it was made so
 * - `modified`: a modified residue whose parent is the protein's letter
 * - `undetermined`: B, Z, J or X on either side
 * - `ambiguous`: another alignment is just as good and pairs this residue otherwise
 * - `tag`: before or behind the protein; `insertion`: inside it, without a partner
 */
export type MapExceptionKind =
  'mismatch' | 'engineered' | 'modified' | 'undetermined' | 'ambiguous' | 'tag' | 'insertion';

export interface MapException {
  kind: MapExceptionKind;
  chainIndex: ChainIndex;
  /** Author label. */
  label: string;
  chainLetter: string;
  /** Partner in the protein, null for `tag` and `insertion`. */
  proteinIndex: ResidueIndex | null;
  proteinLetter: string | null;
  /** What the file says about it. */
  note?: string;
}

/** One chain on one protein. Identity = identical ÷ determined pairs; coverage = pairs ÷ observed residues. */
export interface ChainMap {
  proteinId: string;
  score: number;
  identical: number;
  /** Pairs without B, Z, J or X. */
  determined: number;
  aligned: number;
  identity: number;
  coverage: number;
  segments: MapSegment[];
  exceptions: MapException[];
}
