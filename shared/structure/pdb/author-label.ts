import { residueLabel } from '../draft';
import { type Columns, type LineSpan } from './columns';
import { decodeHybrid36 } from './hybrid-36';

/** `52A` from a number field and the column of the insertion code; null when the number cannot be read. */
export function readAuthorLabel(
  columns: Columns,
  line: LineSpan,
  first: number,
  last: number,
  insertionColumn: number,
): string | null {
  const number = decodeHybrid36(columns.text(line, first, last), last - first + 1);
  if (number === null) return null;
  return residueLabel(number, columns.text(line, insertionColumn, insertionColumn).trim());
}
