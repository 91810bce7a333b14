import type { IssueList } from '../issue-list';
import { linesOf, type TextLine } from '../text-file';
import type { AlignmentLimits } from './limits';

/** A `*` or `?` met in a row; `offset` counts aligned characters of the row from 0. */
export interface RowMark {
  offset: number;
  line: number;
  column: number;
}

/** One record of a FASTA file before rows are compared. */
export interface FastaRecord {
  name: string;
  description: string;
  line: number;
  /** Aligned characters, blanks removed; `?` is X already, `*` still there. */
  text: string;
  stops: RowMark[];
  unknownMarks: RowMark[];
}

const PLAIN_LINE = /^[A-Za-z.~-]*$/;

/** A name short enough for a message. */
export function shown(name: string): string {
  return `"${name.length > 40 ? `${name.slice(0, 39)}…` : name}"`;
}

function describeCharacter(character: string): string {
  const code = character.codePointAt(0) ?? 0;
  const visible = code > 0x20 && code !== 0x7f && !(code >= 0x80 && code < 0xa1);
  return visible ? `"${character}"` : `The character U+${code.toString(16).toUpperCase().padStart(4, '0')}`;
}

function readHeader(line: TextLine, limits: AlignmentLimits, issues: IssueList): FastaRecord {
  const place = { line: line.number, column: 1 };
  const begin = line.text.indexOf('>') + 1;
  const header = line.text.slice(begin).trimEnd();
  const words = /^(\s*)(\S*)\s*(.*)$/s.exec(header);
  const name = words?.[2] ?? '';
  let description = words?.[3] ?? '';
  if (name === '') issues.error('name-missing', 'This row has no name. Write one after the >.', place);
  else if ((words?.[1] ?? '') !== '')
    issues.warning('name-after-space', `A blank stands before the name; ${shown(name)} was taken.`, place);
  if (name.length > limits.maxNameLength)
    issues.error(
      'name-too-long',
      `The name ${shown(name)} has ${name.length} characters; up to ${limits.maxNameLength} are kept. Shorten it.`,
      place,
    );
  if (/[\u0000-\u001f\u007f-\u009f]/.test(name))
    issues.error(
      'name-unreadable',
      `The name ${shown(name)} holds control characters. Write it anew.`,
      place,
    );
  if (description.length > limits.maxDescriptionLength) {
    description = description.slice(0, limits.maxDescriptionLength);
    issues.warning(
      'description-cut',
      `The description of ${shown(name)} was cut to ${limits.maxDescriptionLength} characters.`,
      place,
    );
  }
  return { name, description, line: line.number, text: '', stops: [], unknownMarks: [] };
}

/** Aligned characters of one line; wrong ones are reported and kept as X, so that lengths stay comparable. */
function readLine(line: TextLine, record: FastaRecord, offset: number, issues: IssueList): string {
  if (PLAIN_LINE.test(line.text)) return line.text;
  let kept = '';
  let column = 1;
  for (const character of line.text) {
    const mark = { offset: offset + kept.length, line: line.number, column };
    if (PLAIN_LINE.test(character)) kept += character;
    else if (character === '*') {
      record.stops.push(mark);
      kept += character;
    } else if (character === '?') {
      record.unknownMarks.push(mark);
      kept += 'X';
    } else if (!/\s/.test(character)) {
      issues.error(
        'letter-unknown',
        `${describeCharacter(character)} in row ${shown(record.name)} is neither an amino-acid letter nor a gap (- . ~).`,
        { line: line.number, column },
      );
      kept += 'X';
    }
    column += character.length;
  }
  return kept;
}

/**
 * Splits aligned FASTA into records. Issues: `text-before-header`, `name-missing`, `name-after-space`,
 * `name-too-long`, `name-unreadable`, `description-cut`, `letter-unknown`, `too-many-rows`, `too-many-columns`.
 */
export function readFastaRecords(text: string, limits: AlignmentLimits, issues: IssueList): FastaRecord[] {
  const records: FastaRecord[] = [];
  let parts: string[] = [];
  let width = 0;
  let current: FastaRecord | null = null;
  let textBefore = false;
  const close = () => {
    if (current !== null) current.text = parts.join('');
    parts = [];
    width = 0;
  };
  for (const line of linesOf(text)) {
    if (/^\s*>/.test(line.text)) {
      close();
      if (records.length === limits.maxRows) {
        const message = `More than ${limits.maxRows} rows; cut the file into parts.`;
        issues.error('too-many-rows', message, { line: line.number, column: 1 });
        return records;
      }
      current = readHeader(line, limits, issues);
      records.push(current);
    } else if (current === null) {
      if (line.text.trim() === '' || textBefore) continue;
      textBefore = true;
      const message = 'Text stands before the first row name. Begin the file with > and a name.';
      issues.error('text-before-header', message, { line: line.number, column: 1 });
    } else if (width <= limits.maxColumns) {
      const kept = readLine(line, current, width, issues);
      parts.push(kept);
      width += kept.length;
      if (width > limits.maxColumns) {
        const message = `Row ${shown(current.name)} is wider than ${limits.maxColumns} columns, which is not read.`;
        issues.error('too-many-columns', message, { line: line.number, column: 1 });
      }
    }
  }
  close();
  return records;
}
