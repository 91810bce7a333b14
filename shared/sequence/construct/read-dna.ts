import { hasErrors, type Issue, type ParseResult } from '../parse-result';
import { IUPAC_BASES } from './bases';

export interface DnaRecord {
  /** First word of the title line; empty when the bases came without one. */
  name: string;
  /** Rest of the title line. */
  description: string;
  /** Upper case, T for U, only letters of IUPAC. */
  bases: string;
  /** Line on which the record begins, from 1. */
  line: number;
}

export interface DnaLimits {
  maxBases: number;
  maxRecords: number;
  maxNameLength: number;
  /** Issues of one kind listed singly; the rest is counted. */
  maxListed: number;
}

export const DNA_LIMITS: DnaLimits = {
  maxBases: 500_000,
  maxRecords: 1_000,
  maxNameLength: 200,
  maxListed: 20,
};

const PROTEIN_ONLY = /[EFILPQZJOX*]/gi;

function error(code: string, message: string, line?: number, column?: number): Issue {
  return { code, severity: 'error', message, ...(line ? { line } : {}), ...(column ? { column } : {}) };
}

function shown(text: string): string {
  return text.length > 40 ? `${text.slice(0, 40)}…` : text;
}

/** Numbered sequence text as databases print it: a heading, an end mark. */
function isFrame(line: string): boolean {
  return /^\s*(ORIGIN\s*|\/\/\s*)$/.test(line);
}

class DnaReader {
  readonly issues: Issue[] = [];
  readonly records: DnaRecord[] = [];
  private parts: string[] = [];
  private unknown = 0;
  private degenerate: { count: number; line: number; column: number; letters: Set<string> } | null = null;
  private uracil: number | null = null;
  private total = 0;

  constructor(private readonly limits: DnaLimits) {}

  title(text: string, line: number): void {
    this.finish();
    const [name = '', ...words] = text.trim().split(/\s+/);
    if (name.length > this.limits.maxNameLength)
      this.issues.push({
        code: 'name-shortened',
        severity: 'warning',
        line,
        message: `The name has ${name.length} characters; the first ${this.limits.maxNameLength} are kept.`,
      });
    const description = words.join(' ').slice(0, this.limits.maxNameLength);
    this.records.push({ name: name.slice(0, this.limits.maxNameLength), description, bases: '', line });
  }

  bases(text: string, line: number): boolean {
    if (this.records.length === 0) this.records.push({ name: '', description: '', bases: '', line });
    const clean = text.replace(/[\s\d]/g, '').toUpperCase();
    this.total += clean.length;
    if (this.total > this.limits.maxBases) {
      this.issues.push(
        error(
          'too-many-bases',
          `More than ${this.limits.maxBases} bases; cut the part that is needed.`,
          line,
        ),
      );
      return false;
    }
    if (/[^ACGT]/.test(clean)) this.inspect(text, line);
    this.parts.push(clean.replace(/U/g, 'T'));
    return true;
  }

  private inspect(text: string, line: number): void {
    for (let index = 0; index < text.length; index += 1) {
      const letter = text.charAt(index).toUpperCase();
      if ('ACGT'.includes(letter) || /[\s\d]/.test(letter)) continue;
      if (letter === 'U') this.uracil ??= line;
      else if (letter in IUPAC_BASES) {
        this.degenerate ??= { count: 0, line, column: index + 1, letters: new Set() };
        this.degenerate.count += 1;
        this.degenerate.letters.add(letter);
      } else {
        this.unknown += 1;
        if (this.unknown <= this.limits.maxListed)
          this.issues.push(
            error(
              'unknown-base',
              `"${text.charAt(index)}" is no base; allowed are A, C, G, T, U and the IUPAC letters.`,
              line,
              index + 1,
            ),
          );
      }
    }
  }

  private finish(): void {
    const last = this.records[this.records.length - 1];
    if (last) last.bases = this.parts.join('');
    this.parts = [];
  }

  end(): void {
    this.finish();
    const hidden = this.unknown - this.limits.maxListed;
    if (hidden > 0) this.issues.push(error('unknown-base', `${hidden} more characters are no bases.`));
    if (this.uracil !== null)
      this.issues.push({
        code: 'uracil-read-as-thymine',
        severity: 'warning',
        line: this.uracil,
        message: 'U is read as T.',
      });
    if (this.degenerate)
      this.issues.push({
        code: 'degenerate-bases',
        severity: 'warning',
        line: this.degenerate.line,
        column: this.degenerate.column,
        message: `${this.degenerate.count} bases are not settled (${[...this.degenerate.letters].sort().join(', ')}); codons that hold one read as X and no primer may cover one.`,
      });
    for (const record of this.records)
      if (record.bases.length === 0)
        this.issues.push(error('empty-record', `"${shown(record.name)}" has no bases.`, record.line));
  }
}

/**
 * Reads DNA as people paste it: FASTA, or bare letters; numbers and blanks of numbered sequence text are dropped. All records.
 *
 * Errors: `empty`, `binary`, `too-many-bases`, `too-many-records`, `unknown-base`, `looks-like-protein`, `empty-record`.
 * Warnings: `uracil-read-as-thymine`, `degenerate-bases`, `name-shortened`. Lines and columns from 1.
 */
export function readDnaRecords(text: string, limits: Partial<DnaLimits> = {}): ParseResult<DnaRecord[]> {
  const allowed = { ...DNA_LIMITS, ...limits };
  const plain = text.replace(/^\uFEFF/, '');
  const refuse = (issue: Issue): ParseResult<DnaRecord[]> => ({ value: null, issues: [issue] });
  if (plain.trim() === '')
    return refuse(error('empty', 'There is nothing to read; paste DNA or a FASTA record.'));
  // eslint would read control characters as a mistake in a pattern; a file with them is no text.
  for (let index = 0; index < Math.min(plain.length, 4096); index += 1) {
    const code = plain.charCodeAt(index);
    if (code === 0xfffd || (code < 32 && code !== 9 && code !== 10 && code !== 13 && code !== 12))
      return refuse(error('binary', 'This is not a text file; export the DNA as FASTA.'));
  }
  const reader = new DnaReader(allowed);
  const lines = plain.split(/\r\n|\r|\n/);
  for (const [index, line] of lines.entries()) {
    if (line.trim() === '' || line.startsWith(';') || isFrame(line)) continue;
    if (line.startsWith('>')) {
      if (reader.records.length >= allowed.maxRecords)
        return refuse(error('too-many-records', `More than ${allowed.maxRecords} records.`, index + 1));
      reader.title(line.slice(1), index + 1);
    } else if (!reader.bases(line, index + 1)) break;
  }
  reader.end();
  if (hasErrors(reader.issues)) {
    const letters = lines
      .filter((line) => !line.startsWith('>'))
      .join('')
      .replace(/[\s\d]/g, '');
    const foreign = letters.match(PROTEIN_ONLY)?.length ?? 0;
    if (foreign > letters.length / 10)
      reader.issues.unshift(
        error('looks-like-protein', 'This reads like a protein; paste the DNA that encodes it.'),
      );
    return { value: null, issues: reader.issues };
  }
  if (reader.records.length === 0) return refuse(error('empty', 'There is no sequence in it.'));
  return { value: reader.records, issues: reader.issues };
}

/**
 * The one record of a construct. Besides the issues of `readDnaRecords`: `several-records` (error), which lists the names so that
 * one can be chosen, unless `name` chooses it; `record-not-found`.
 */
export function readDna(
  text: string,
  options: { name?: string; limits?: Partial<DnaLimits> } = {},
): ParseResult<DnaRecord> {
  const { value, issues } = readDnaRecords(text, options.limits);
  if (value === null) return { value: null, issues };
  const names = value.map((record) => shown(record.name || 'without a name')).slice(0, DNA_LIMITS.maxListed);
  const more = value.length > names.length ? ` and ${value.length - names.length} more` : '';
  const chosen = options.name === undefined ? value : value.filter((record) => record.name === options.name);
  const [first, second] = chosen;
  if (first === undefined)
    return {
      value: null,
      issues: [
        ...issues,
        error(
          'record-not-found',
          `There is no record "${shown(options.name ?? '')}"; there are: ${names.join(', ')}${more}.`,
        ),
      ],
    };
  if (second !== undefined)
    return {
      value: null,
      issues: [
        ...issues,
        error(
          'several-records',
          `${chosen.length} records where one is read; choose one: ${names.join(', ')}${more}.`,
          second.line,
        ),
      ],
    };
  return { value: first, issues };
}
