import { columnIndex, residueIndex, type ColumnIndex, type ResidueIndex } from '../positions';
import type { Alignment, AlignmentRow, AlignmentSegment } from './types';

/** The last of sorted segments that begins at or before `value`, by a key. */
function lastStartingBy(
  segments: readonly AlignmentSegment[],
  value: number,
  key: 'columnStart' | 'proteinStart',
): AlignmentSegment | undefined {
  let low = 0;
  let high = segments.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    const segment = segments[middle];
    if (segment !== undefined && segment[key] <= value) low = middle + 1;
    else high = middle;
  }
  return segments[low - 1];
}

/** The residue a row carries in a column, or null for a gap or a column outside. All from 0. */
export function residueAtColumn(
  row: { segments: readonly AlignmentSegment[] },
  column: ColumnIndex,
): ResidueIndex | null {
  const segment = lastStartingBy(row.segments, column, 'columnStart');
  if (segment === undefined || column >= segment.columnStart + segment.length) return null;
  return residueIndex(segment.proteinStart + column - segment.columnStart);
}

/** The column in which a row carries a residue, or null when the row has no such residue. All from 0. */
export function columnOfResidue(
  row: { segments: readonly AlignmentSegment[] },
  residue: ResidueIndex,
): ColumnIndex | null {
  const segment = lastStartingBy(row.segments, residue, 'proteinStart');
  if (segment === undefined || residue >= segment.proteinStart + segment.length) return null;
  return columnIndex(segment.columnStart + residue - segment.proteinStart);
}

/** What one row carries in a column; letter and residue are null in a gap. */
export interface ColumnCell {
  row: AlignmentRow;
  residue: ResidueIndex | null;
  /** Upper case. */
  letter: string | null;
}

/** What every row carries in a column, in the order of the rows. */
export function cellsOfColumn(alignment: Alignment, column: ColumnIndex): ColumnCell[] {
  return alignment.rows.map((row) => {
    const residue = residueAtColumn(row, column);
    return { row, residue, letter: residue === null ? null : (row.residues[residue] ?? null) };
  });
}
