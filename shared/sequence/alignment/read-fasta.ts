import { isGap } from '../alphabet';
import { IssueList } from '../issue-list';
import type { ParseResult } from '../parse-result';
import { columnIndex, residueIndex } from '../positions';
import { checkEmptyRows, checkProtein, checkRepeats, checkWidths } from './compare-rows';
import { readFastaRecords, shown, type FastaRecord } from './fasta-records';
import { ALIGNMENT_LIMITS, type AlignmentLimits } from './limits';
import { firstNumberOfName } from './row-name';
import { dropStopMarks } from './stop-marks';
import type { Alignment, AlignmentRow, AlignmentSegment } from './types';

/** Runs of columns without gap characters, with the residue each begins with. */
export function segmentsOfText(text: string): AlignmentSegment[] {
  const segments: AlignmentSegment[] = [];
  let residues = 0;
  let start = -1;
  for (let column = 0; column <= text.length; column += 1) {
    const gap = column === text.length || isGap(text.charAt(column));
    if (!gap && start === -1) start = column;
    if (!gap || start === -1) continue;
    const length = column - start;
    segments.push({ columnStart: columnIndex(start), proteinStart: residueIndex(residues), length });
    residues += length;
    start = -1;
  }
  return segments;
}

function toRow(record: FastaRecord, issues: IssueList): AlignmentRow {
  const { name, description, text, line, unknownMarks } = record;
  const residues = text.replace(/[-.~]+/g, '').toUpperCase();
  const mark = unknownMarks[0];
  if (mark !== undefined) {
    const count = unknownMarks.length === 1 ? 'A question mark' : `${unknownMarks.length} question marks`;
    const place = { line: mark.line, column: mark.column };
    issues.warning('residue-unknown', `${count} in row ${shown(name)} read as X (unknown residue).`, place);
  }
  const firstNumber = firstNumberOfName(name, residues.length, line, issues);
  const row = { name, description, text, residues, segments: segmentsOfText(text), line };
  return firstNumber === undefined ? row : { ...row, firstNumber };
}

/**
 * Reads aligned FASTA: `>name description`, then aligned letters on any number of lines, for each row.
 * Gaps are `-`, `.` and `~`; blanks are removed; `?` is X. Positions in issues count from 1 in the text.
 * Errors: `no-rows`, `row-length`, `rows-not-aligned`, `row-empty`, `row-without-residues`, `name-duplicate`,
 * `rows-are-dna`, `stop-inside-row`, and those of `readFastaRecords`. Warnings: `stop-at-end`, `residue-unknown`,
 * `rows-equal`, `range-length`, `range-reversed`. The value is null when there is an error. Never throws.
 */
export function readAlignedFasta(
  text: string,
  limits: Partial<AlignmentLimits> = {},
): ParseResult<Alignment> {
  const all = { ...ALIGNMENT_LIMITS, ...limits };
  const issues = new IssueList(all.maxIssues);
  const records = readFastaRecords(text, all, issues);
  if (records.length === 0) issues.error('no-rows', 'The file holds no row. A row begins with > and a name.');
  dropStopMarks(records, issues);
  checkEmptyRows(records, issues);
  const columnCount = checkWidths(records, issues);
  checkRepeats(records, issues);
  checkProtein(records, issues);
  const rows = records.map((record) => toRow(record, issues));
  return issues.result({ format: 'fasta', columnCount, rows });
}
