import type { ColumnIndex, ResidueIndex } from '../positions';

export type AlignmentFormat = 'fasta' | 'stockholm' | 'blocks';

/** A run of columns in which a row has residues without a gap. */
export interface AlignmentSegment {
  columnStart: ColumnIndex;
  proteinStart: ResidueIndex;
  length: number;
}

export interface AlignmentRow {
  name: string;
  description: string;
  /** Aligned text as in the file (case kept), blanks removed; as long as the alignment is wide. */
  text: string;
  /** Upper case, without gaps. */
  residues: string;
  segments: AlignmentSegment[];
  /** Number of the first residue when the name says so (`name/13-79`). */
  firstNumber?: number;
  /** Line of the file on which the row begins, from 1. */
  line: number;
}

export interface Alignment {
  format: AlignmentFormat;
  columnCount: number;
  rows: AlignmentRow[];
}
