import type { IssueList } from '../issue-list';
import { shown } from './fasta-records';

/**
 * Number of the first residue when a row's name ends in a range (`name/13-79`), else undefined.
 * Warnings: `range-reversed` (start after end: a reverse strand, so DNA), `range-length` (the range does not
 * hold as many residues as the row; its start is taken all the same).
 */
export function firstNumberOfName(
  name: string,
  residueCount: number,
  line: number,
  issues: IssueList,
): number | undefined {
  const range = /^.+\/(\d{1,7})-(\d{1,7})$/.exec(name);
  if (range === null) return undefined;
  const start = Number(range[1]);
  const end = Number(range[2]);
  const place = { line, column: 1 };
  if (start > end) {
    const message = `The range of ${shown(name)} runs backwards, as on a DNA strand; it was not used as a numbering.`;
    issues.warning('range-reversed', message, place);
    return undefined;
  }
  const stated = end - start + 1;
  if (stated !== residueCount) {
    const message = `${shown(name)} states ${stated} residues, the row has ${residueCount}; numbers start at ${start}.`;
    issues.warning('range-length', message, place);
  }
  return start;
}
