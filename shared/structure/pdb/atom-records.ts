import { AlternateChooser } from '../alternates';
import { AtomTable, type AtomRow } from '../atom-table';
import { elementFromName } from '../element';
import type { IssueList } from '../issue-list';
import { isPolymerKind, residueKind } from '../residue-kind';
import { BLANK, type Columns, type LineSpan } from './columns';
import { decodeHybrid36 } from './hybrid-36';
import { ResidueRegistry } from './residue-registry';

/** Last column of z: a line that ends before it has no position. */
const POSITION_END = 54;

/**
 * Reads ATOM and HETATM lines of one model by column. Fields that are the same as on the line before are compared as
 * bytes and not read again, and numbers are read without making strings: almost every line is of that kind.
 */
export class AtomRecords {
  readonly table = new AtomTable();
  readonly registry: ResidueRegistry;
  /** Author id of the chain of the last atom, for a TER that names none. */
  lastChain = ' ';
  private readonly chooser: AlternateChooser;
  private readonly nameIds = new Map<number, number>();
  private readonly elementIds = new Map<number, number>();
  private readonly row: AtomRow = { name: 0, element: 0, alternate: BLANK, occupancy: 1, x: 0, y: 0, z: 0 };
  private residue = -1;
  private inPolymer = false;
  /** Columns 17–27 but the alternate mark, and the record, of the last atom that found its residue. */
  private lastName = 0;
  private lastPlace = 0;
  private lastCode = 0;
  private lastHetero = false;

  constructor(
    private readonly columns: Columns,
    private readonly issues: IssueList,
  ) {
    this.registry = new ResidueRegistry(issues);
    this.chooser = new AlternateChooser(this.table, this.registry.residues);
  }

  /** True when the atom was kept or was a position of one that is. */
  read(line: LineSpan, hetero: boolean): boolean {
    const { columns, row } = this;
    const { start } = line;
    if (line.end - start < POSITION_END) return this.refuseShort(line);
    row.x = columns.decimal(start + 30, start + 38, NaN);
    row.y = columns.decimal(start + 38, start + 46, NaN);
    row.z = columns.decimal(start + 46, start + 54, NaN);
    if (Number.isNaN(row.x + row.y + row.z)) return this.refusePosition(line);
    row.alternate = columns.byte(start + 16);
    row.occupancy = this.readOccupancy(line);

    const name = columns.four(start + 17);
    const place = columns.four(start + 22);
    const code = (columns.byte(start + 21) << 8) | columns.byte(start + 26);
    const same =
      name === this.lastName &&
      place === this.lastPlace &&
      code === this.lastCode &&
      hetero === this.lastHetero;
    if (!same || this.residue < 0) {
      this.lastName = name;
      this.lastPlace = place;
      this.lastCode = code;
      this.lastHetero = hetero;
      if (!this.findResidue(line, hetero)) return false;
    }
    row.name = this.nameId(line);
    row.element = this.elementId(line);
    if (!this.chooser.add(row)) return this.refuseDuplicate(line);
    const residue = this.registry.residues[this.residue];
    if (!residue) return false;
    if (row.alternate !== BLANK) residue.marked = true;
    if (row.occupancy === 0 && residue.zeroOccupancyLine === 0) residue.zeroOccupancyLine = line.number;
    return true;
  }

  /** TER: of the chain it names, else of the last atom's. */
  end(line: LineSpan): void {
    const named = this.columns.text(line, 22, 22);
    this.registry.endPolymer(named === '' || named === ' ' ? this.lastChain : named);
    this.residue = -1;
  }

  private findResidue(line: LineSpan, hetero: boolean): boolean {
    this.residue = -1;
    const numberField = this.columns.text(line, 23, 26);
    let authorNumber = decodeHybrid36(numberField, 4);
    let insertionCode = this.columns.text(line, 27, 27).trim();
    if (authorNumber === null) {
      this.issues.warn(
        'bad-residue-number',
        `"${numberField.trim()}" in columns 23 to 26 is no residue number; this atom is left out.`,
        { line: line.number, column: 23 },
      );
      return false;
    }
    if (/^\d$/.test(insertionCode) && /^\d{4}$/.test(numberField)) {
      // Five digits that run into the insertion code's column: some programs write numbers above 9999 so.
      authorNumber = Number(numberField + insertionCode);
      insertionCode = '';
    }
    const name = this.columns.text(line, 18, 21).trim();
    this.lastChain = this.columns.text(line, 22, 22);
    const found = this.registry.find({
      name,
      chain: this.lastChain,
      authorNumber,
      insertionCode,
      hetero,
      alternate: this.row.alternate,
      line: line.number,
    });
    if (found === null) return false;
    this.residue = found;
    this.inPolymer = isPolymerKind(residueKind(name).kind);
    this.chooser.openResidue(found);
    return true;
  }

  /** A line may end before the occupancy, or leave it blank: then the position is whole. */
  private readOccupancy(line: LineSpan): number {
    const from = line.start + 54;
    const occupancy = this.columns.decimal(from, Math.min(line.start + 60, Math.max(line.end, from)), 1);
    if (!Number.isNaN(occupancy)) return occupancy;
    this.issues.warn('bad-occupancy', 'The occupancy in columns 55 to 60 is no number; 1 is taken.', {
      line: line.number,
      column: 55,
    });
    return 1;
  }

  private nameId(line: LineSpan): number {
    const packed = this.columns.four(line.start + 12);
    const known = this.nameIds.get(packed);
    if (known !== undefined) return known;
    const id = this.table.addName(this.columns.text(line, 13, 16).trim());
    this.nameIds.set(packed, id);
    return id;
  }

  /** Columns 77–78 where they hold letters, else from the name. */
  private elementId(line: LineSpan): number {
    const at = line.start + 76;
    const first = at < line.end ? this.columns.byte(at) : BLANK;
    const second = at + 1 < line.end ? this.columns.byte(at + 1) : BLANK;
    const stated = isLetter(second) && (first === BLANK || isLetter(first));
    // Two letters fit below 2^16; above it, the atom's name id and whether its residue is a polymer's.
    const key = stated ? (first << 8) | second : 0x10000 + this.row.name * 2 + (this.inPolymer ? 1 : 0);
    const known = this.elementIds.get(key);
    if (known !== undefined) return known;
    const symbol = stated
      ? String.fromCharCode(first, second).trim().toUpperCase()
      : elementFromName(this.columns.text(line, 13, 16), this.inPolymer);
    const id = this.table.elementId(symbol);
    this.elementIds.set(key, id);
    return id;
  }

  private refuseShort(line: LineSpan): false {
    const columns = line.end - line.start;
    const message = `This atom line ends at column ${columns}, before its position does (54); it is left out.`;
    this.issues.warn('line-truncated', message, { line: line.number, column: columns + 1 });
    return false;
  }

  private refusePosition(line: LineSpan): false {
    const { x, y } = this.row;
    const column = Number.isNaN(x) ? 31 : Number.isNaN(y) ? 39 : 47;
    const field = this.columns.text(line, column, column + 7).trim();
    const message = `"${field}" in columns ${column} to ${column + 7} is no coordinate; this atom is left out.`;
    this.issues.warn('bad-coordinate', message, { line: line.number, column });
    return false;
  }

  private refuseDuplicate(line: LineSpan): false {
    const residue = this.registry.residues[this.residue];
    const label = residue ? `${residue.authorNumber}${residue.insertionCode}` : '';
    const name = this.columns.text(line, 13, 16).trim();
    this.issues.warn('duplicate-atom', `Atom ${name} of residue ${label} comes twice; the first is kept.`, {
      line: line.number,
      column: 13,
      chain: this.lastChain,
      residue: label,
    });
    return false;
  }
}

function isLetter(byte: number): boolean {
  return (byte >= 65 && byte <= 90) || (byte >= 97 && byte <= 122);
}
