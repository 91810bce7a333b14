import { IssueList } from '../issue-list';
import type { ParseResult } from '../parse-result';
import { linesOf } from '../text-file';
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
  /** Of all records together. */
  maxBases: number;
  maxRecords: number;
  maxNameLength: number;
}

export const DNA_LIMITS: DnaLimits = { maxBases: 500_000, maxRecords: 1_000, maxNameLength: 200 };

/** Letters that are amino acids and no bases of any kind. */
const PROTEIN_ONLY = /[EFILPQZJOX*]/i;
/** More of them than this share: a protein was pasted (choice, no source). */
const PROTEIN_SHARE = 0.1;
const NAMES_LISTED = 20;

function shown(text: string): string {
  return text.length > 40 ? `${text.slice(0, 40)}…` : text;
}

/** Heading and end mark of numbered sequence text as databases print it. */
function isFrame(line: string): boolean {
  return /^\s*(ORIGIN|\/\/)\s*$/.test(line);
}

/** Characters no text has; a place beyond the first few thousand is found as an unknown base. */
function isBinary(text: string): boolean {
  for (let index = 0; index < Math.min(text.length, 4096); index += 1) {
    const code = text.charCodeAt(index);
    if (code === 0xfffd || (code < 32 && !(code >= 9 && code <= 13))) return true;
  }
  return false;
}

/** Gathers records line by line; what is unclear in the letters is told once, at the end. */
class DnaReader {
  readonly records: DnaRecord[] = [];
  private parts: string[] = [];
  private total = 0;
  private foreign = 0;
  private uracil: { line: number; column: number } | null = null;
  private degenerate: { line: number; column: number } | null = null;
  private readonly degenerateLetters = new Map<string, number>();

  constructor(
    private readonly limits: DnaLimits,
    private readonly issues: IssueList,
  ) {}

  title(text: string, line: number): void {
    this.finish();
    const { maxNameLength } = this.limits;
    const [name = '', ...words] = text.trim().split(/\s+/);
    if (name.length > maxNameLength)
      this.issues.warning(
        'name-shortened',
        `The name has ${name.length} characters; the first ${maxNameLength} are kept.`,
        { line },
      );
    const description = words.join(' ').slice(0, maxNameLength);
    this.records.push({ name: name.slice(0, maxNameLength), description, bases: '', line });
  }

  /** False when there are too many. */
  bases(text: string, line: number): boolean {
    if (this.records.length === 0) this.records.push({ name: '', description: '', bases: '', line });
    const clean = text.replace(/[\s\d]/g, '').toUpperCase();
    this.total += clean.length;
    const { maxBases } = this.limits;
    if (this.total > maxBases) {
      this.issues.error('too-many-bases', `More than ${maxBases} bases; cut out the part that is needed.`, {
        line,
      });
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
      const place = { line, column: index + 1 };
      if (letter === 'U') this.uracil ??= place;
      else if (letter in IUPAC_BASES) {
        this.degenerate ??= place;
        this.degenerateLetters.set(letter, (this.degenerateLetters.get(letter) ?? 0) + 1);
      } else {
        if (PROTEIN_ONLY.test(letter)) this.foreign += 1;
        this.issues.error(
          'unknown-base',
          `"${text.charAt(index)}" is no base; allowed are A, C, G, T, U and the IUPAC letters.`,
          place,
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
    if (this.foreign > this.total * PROTEIN_SHARE)
      this.issues.error('looks-like-protein', 'This reads like a protein; paste the DNA that encodes it.');
    if (this.uracil) this.issues.warning('uracil-read-as-thymine', 'U is read as T.', this.uracil);
    if (this.degenerate) {
      const count = [...this.degenerateLetters.values()].reduce((sum, each) => sum + each, 0);
      const letters = [...this.degenerateLetters.keys()].sort().join(', ');
      this.issues.warning(
        'degenerate-bases',
        `${count} bases are not settled (${letters}); codons that hold one read as X, and no primer may cover one.`,
        this.degenerate,
      );
    }
    for (const { name, bases, line } of this.records)
      if (bases.length === 0) this.issues.error('empty-record', `"${shown(name)}" has no bases.`, { line });
    if (this.records.length === 0) this.issues.error('empty', 'There is no sequence in it.');
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
  const issues = new IssueList();
  const plain = text.startsWith('\uFEFF') ? text.slice(1) : text;
  if (plain.trim() === '') issues.error('empty', 'There is nothing to read; paste DNA or a FASTA record.');
  else if (isBinary(plain)) issues.error('binary', 'This is not a text file; export the DNA as FASTA.');
  if (issues.hasErrors) return issues.result([]);
  const reader = new DnaReader(allowed, issues);
  for (const { number, text: line } of linesOf(plain)) {
    if (line.trim() === '' || line.startsWith(';') || isFrame(line)) continue;
    if (!line.startsWith('>')) {
      if (!reader.bases(line, number)) break;
    } else if (reader.records.length < allowed.maxRecords) reader.title(line.slice(1), number);
    else {
      issues.error('too-many-records', `More than ${allowed.maxRecords} records.`, { line: number });
      break;
    }
  }
  reader.end();
  return issues.result(reader.records);
}

/**
 * The one record of a construct, chosen by `name` when there are several. Besides the issues of `readDnaRecords`, errors:
 * `several-records` (the names are listed, so that one can be chosen), `record-not-found`.
 */
export function readDna(
  text: string,
  options: { name?: string; limits?: Partial<DnaLimits> } = {},
): ParseResult<DnaRecord> {
  const { value, issues } = readDnaRecords(text, options.limits);
  if (value === null) return { value: null, issues };
  const names = value.slice(0, NAMES_LISTED).map((record) => shown(record.name || 'without a name'));
  const more = value.length > names.length ? ` and ${value.length - names.length} more` : '';
  const list = `${names.join(', ')}${more}`;
  const chosen = options.name === undefined ? value : value.filter(({ name }) => name === options.name);
  const [first, second] = chosen;
  if (first && !second) return { value: first, issues };
  const problem = second
    ? {
        code: 'several-records',
        line: second.line,
        message: `${chosen.length} records where one is read; choose one: ${list}.`,
      }
    : {
        code: 'record-not-found',
        message: `There is no record "${shown(options.name ?? '')}"; there are: ${list}.`,
      };
  return { value: null, issues: [...issues, { ...problem, severity: 'error' }] };
}
