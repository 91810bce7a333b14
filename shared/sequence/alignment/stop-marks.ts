import { isGap } from '../alphabet';
import type { IssueList } from '../issue-list';
import { shown, type FastaRecord } from './fasta-records';

function onlyGapsAfter(text: string, offset: number): boolean {
  for (let index = offset + 1; index < text.length; index += 1) if (!isGap(text.charAt(index))) return false;
  return true;
}

/**
 * Takes stop marks out of the rows: one at the end of a row is a stop and dropped, with one warning for all
 * rows (`stop-at-end`); one inside a row is an error with its place (`stop-inside-row`).
 * A dropped mark leaves a gap where the rows are as wide with it as without it, else nothing.
 */
export function dropStopMarks(records: readonly FastaRecord[], issues: IssueList): void {
  const rawWidths = new Set(records.map((record) => record.text.length));
  const marksAreColumns = rawWidths.size === 1;
  let stopped = 0;
  let firstStop: { line: number; column: number } | null = null;
  for (const record of records) {
    const last = record.stops.at(-1);
    if (last === undefined) continue;
    const ends = onlyGapsAfter(record.text, last.offset);
    for (const stop of ends ? record.stops.slice(0, -1) : record.stops) {
      const message = `A stop (*) stands inside row ${shown(record.name)}. Is this the right reading frame, or two proteins in one row?`;
      issues.error('stop-inside-row', message, { line: stop.line, column: stop.column });
    }
    const isFinal = last.offset === record.text.length - 1;
    const tail = ends ? (isFinal && !marksAreColumns ? '' : '-') : 'X';
    record.text = `${record.text.slice(0, last.offset)}${tail}${record.text.slice(last.offset + 1)}`;
    if (!ends) continue;
    stopped += 1;
    firstStop ??= { line: last.line, column: last.column };
  }
  if (firstStop === null) return;
  const rows = stopped === 1 ? 'one row' : `${stopped} rows`;
  issues.warning('stop-at-end', `A stop (*) at the end of ${rows} was left out.`, firstStop);
  if (marksAreColumns) dropEmptyLastColumn(records);
}

/** A column that held stop marks and gaps alone is no column of the alignment. */
function dropEmptyLastColumn(records: readonly FastaRecord[]): void {
  const width = records[0]?.text.length ?? 0;
  const stopColumn = records.some((record) => record.stops.some((stop) => stop.offset === width - 1));
  if (!stopColumn || !records.every((record) => isGap(record.text.charAt(width - 1)))) return;
  for (const record of records) record.text = record.text.slice(0, -1);
}
