import type { IssueList } from '../issue-list';
import type { DatabaseReference, SequenceDifference } from '../types';
import { readAuthorLabel } from './author-label';
import { type Columns, type LineSpan } from './columns';

/** DBREF, the pair DBREF1 and DBREF2 (for long accessions), and SEQADV, by author chain id. */
export class DatabaseRecords {
  readonly differences = new Map<string, SequenceDifference[]>();
  private readonly references = new Map<string, DatabaseReference[]>();
  /** First halves that wait for their second. */
  private readonly halves = new Map<string, { begin: string; end: string; database: string; line: number }>();

  constructor(
    private readonly columns: Columns,
    private readonly issues: IssueList,
  ) {}

  read(line: LineSpan): void {
    const record = this.text(line, 1, 6);
    if (record === 'SEQADV') this.readDifference(line);
    else if (record === 'DBREF2') this.readSecondHalf(line);
    else this.readReference(line, record === 'DBREF1');
  }

  finish(): Map<string, DatabaseReference[]> {
    for (const [chain, half] of this.halves) {
      this.issues.warn('reference-row', `DBREF1 of chain ${chain} has no DBREF2.`, {
        line: half.line,
        chain,
      });
    }
    return this.references;
  }

  private readReference(line: LineSpan, isHalf: boolean): void {
    const chain = this.columns.text(line, 13, 13);
    const begin = readAuthorLabel(this.columns, line, 15, 18, 19);
    const end = readAuthorLabel(this.columns, line, 21, 24, 25);
    const database = this.text(line, 27, 32);
    if (begin === null || end === null) return this.unreadable(line, chain);
    if (isHalf) {
      this.halves.set(chain, { begin, end, database, line: line.number });
      return;
    }
    const accession = this.text(line, 34, 41);
    this.addReference(line, chain, { begin, end, database, accession }, [56, 60], [63, 67]);
  }

  private readSecondHalf(line: LineSpan): void {
    const chain = this.columns.text(line, 13, 13);
    const half = this.halves.get(chain);
    if (!half) return this.unreadable(line, chain);
    this.halves.delete(chain);
    const { begin, end, database } = half;
    const accession = this.text(line, 19, 40);
    this.addReference(line, chain, { begin, end, database, accession }, [46, 55], [58, 67]);
  }

  private addReference(
    line: LineSpan,
    chain: string,
    reference: Omit<DatabaseReference, 'databaseBegin' | 'databaseEnd'>,
    beginColumns: readonly [number, number],
    endColumns: readonly [number, number],
  ): void {
    const databaseBegin = this.text(line, ...beginColumns);
    const databaseEnd = this.text(line, ...endColumns);
    if (!/^-?\d+$/.test(databaseBegin) || !/^-?\d+$/.test(databaseEnd)) return this.unreadable(line, chain);
    append(this.references, chain, {
      ...reference,
      databaseBegin: Number(databaseBegin),
      databaseEnd: Number(databaseEnd),
    });
  }

  private readDifference(line: LineSpan): void {
    append(this.differences, this.columns.text(line, 17, 17), {
      // A residue that the chain lacks (a deletion) has no number.
      label: readAuthorLabel(this.columns, line, 19, 22, 23) ?? '',
      residueName: this.text(line, 13, 15),
      databaseResidue: this.text(line, 40, 42),
      databaseNumber: this.text(line, 44, 48),
      comment: this.text(line, 50, 70),
    });
  }

  private text(line: LineSpan, first: number, last: number): string {
    return this.columns.text(line, first, last).trim();
  }

  private unreadable(line: LineSpan, chain: string): void {
    this.issues.warn(
      'reference-row',
      'This DBREF row cannot be read: its numbers are not where they belong.',
      {
        line: line.number,
        chain,
      },
    );
  }
}

function append<T>(rows: Map<string, T[]>, key: string, row: T): void {
  const known = rows.get(key);
  if (known) known.push(row);
  else rows.set(key, [row]);
}
