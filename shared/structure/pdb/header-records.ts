import type { Declarations } from '../draft';
import type { IssueList } from '../issue-list';
import { type Columns, type LineSpan } from './columns';
import { readAuthorLabel } from './author-label';
import { DatabaseRecords } from './database-records';
import { decodeHybrid36 } from './hybrid-36';
import { MissingRecords } from './missing-records';

/**
 * Reads TITLE, SEQRES, MODRES, DBREF, DBREF1/2, SEQADV and REMARK 465 by column.
 * Source of the columns: PDB format 3.3 (wwPDB, 2012).
 */
export class HeaderRecords {
  /** Rows read, of whatever kind: what a limit is held against. */
  entries = 0;
  private readonly titleParts: Uint8Array[] = [];
  private readonly sequences = new Map<string, string[]>();
  private readonly statedLengths = new Map<string, { length: number; line: number }>();
  private readonly parents = new Map<string, string>();
  private readonly parentsByName = new Map<string, string>();
  private readonly database: DatabaseRecords;
  private readonly missing: MissingRecords;

  constructor(
    private readonly columns: Columns,
    private readonly issues: IssueList,
  ) {
    this.database = new DatabaseRecords(columns, issues);
    this.missing = new MissingRecords(columns);
  }

  read(line: LineSpan): void {
    switch (this.columns.text(line, 1, 6).trimEnd()) {
      case 'TITLE':
        if (this.titleParts.length < 100)
          this.titleParts.push(this.columns.bytes.subarray(line.start + 10, line.end));
        break;
      case 'SEQRES':
        this.readSequence(line);
        break;
      case 'MODRES':
        this.readModified(line);
        break;
      case 'REMARK':
        if (this.missing.read(line)) this.entries++;
        break;
      case 'DBREF':
      case 'DBREF1':
      case 'DBREF2':
      case 'SEQADV':
        this.database.read(line);
        this.entries++;
    }
  }

  finish(): Declarations {
    for (const [chain, stated] of this.statedLengths) {
      const found = this.sequences.get(chain)?.length ?? 0;
      if (found === stated.length) continue;
      this.issues.warn(
        'declared-length',
        `SEQRES says that chain ${chain} has ${stated.length} residues and lists ${found}.`,
        { line: stated.line, column: 14, chain },
      );
    }
    return {
      title: titleOf(this.titleParts),
      sequences: this.sequences,
      missing: this.missing.byChain,
      differences: this.database.differences,
      references: this.database.finish(),
      parentOf: (name, chain, label) =>
        this.parents.get(`${chain}|${label}|${name}`) ?? this.parentsByName.get(name),
    };
  }

  private readSequence(line: LineSpan): void {
    const chain = this.columns.text(line, 12, 12) || ' ';
    const names = this.sequences.get(chain) ?? [];
    if (!this.sequences.has(chain)) {
      this.sequences.set(chain, names);
      const length = decodeHybrid36(this.columns.text(line, 14, 17), 4);
      if (length !== null) this.statedLengths.set(chain, { length, line: line.number });
    }
    for (let column = 20; column <= 68; column += 4) {
      const name = this.columns.text(line, column, column + 2).trim();
      if (name !== '') {
        names.push(name);
        this.entries++;
      }
    }
  }

  private readModified(line: LineSpan): void {
    this.entries++;
    const name = this.columns.text(line, 13, 15).trim();
    const chain = this.columns.text(line, 17, 17);
    const label = readAuthorLabel(this.columns, line, 19, 22, 23);
    const parent = this.columns.text(line, 25, 27).trim();
    if (name === '' || parent === '' || label === null) {
      this.issues.warn(
        'modified-row',
        'This MODRES row cannot be read: name, number and parent are expected.',
        {
          line: line.number,
        },
      );
      return;
    }
    this.parents.set(`${chain}|${label}|${name}`, parent);
    if (parent !== name && !this.parentsByName.has(name)) this.parentsByName.set(name, parent);
  }
}

/** UTF-8, or Latin-1 when it is not. */
function titleOf(parts: readonly Uint8Array[]): string {
  const texts = parts.map((part) => {
    try {
      return new TextDecoder('utf-8', { fatal: true }).decode(part);
    } catch {
      return Array.from(part, (byte) => String.fromCharCode(byte)).join('');
    }
  });
  return texts.join(' ').replace(/\s+/g, ' ').trim();
}
