import type { AtomArrays } from './types';

const FIRST_CAPACITY = 4096;

/** One atom as read; a reader fills the same object again and again. Coordinates in ångström. */
export interface AtomRow {
  /** Id of its name and of its element, from the table's `addName` and `elementId`. */
  name: number;
  element: number;
  /** Code of the alternate mark; 32 (a blank) for none. */
  alternate: number;
  occupancy: number;
  x: number;
  y: number;
  z: number;
}

/** Atoms in file order as growing columns, each with the index of its residue. */
export class AtomTable {
  count = 0;
  residueOf = new Int32Array(FIRST_CAPACITY);
  nameOf = new Int32Array(FIRST_CAPACITY);
  occupancy = new Float32Array(FIRST_CAPACITY);
  alternate = new Uint8Array(FIRST_CAPACITY);
  private x = new Float32Array(FIRST_CAPACITY);
  private y = new Float32Array(FIRST_CAPACITY);
  private z = new Float32Array(FIRST_CAPACITY);
  private elementOf = new Int32Array(FIRST_CAPACITY);
  private readonly names: string[] = [];
  private readonly elements: string[] = [];
  private readonly elementIds = new Map<string, number>();

  /** A name of its own: two names that read alike may still be two atoms (` CA ` and `CA  `). */
  addName(text: string): number {
    return this.names.push(text) - 1;
  }

  elementId(symbol: string): number {
    const known = this.elementIds.get(symbol);
    if (known !== undefined) return known;
    const id = this.elements.push(symbol) - 1;
    this.elementIds.set(symbol, id);
    return id;
  }

  append(residue: number, atom: AtomRow): number {
    const at = this.count++;
    if (at === this.x.length) this.grow();
    this.residueOf[at] = residue;
    this.nameOf[at] = atom.name;
    this.put(at, atom);
    return at;
  }

  /** Gives the atom at an index another position. */
  put(at: number, atom: AtomRow): void {
    this.alternate[at] = atom.alternate;
    this.occupancy[at] = atom.occupancy;
    this.x[at] = atom.x;
    this.y[at] = atom.y;
    this.z[at] = atom.z;
    this.elementOf[at] = atom.element;
  }

  /** The atoms sorted so that each residue's begin where `startOfResidue` says; in file order within a residue. */
  arrange(startOfResidue: Int32Array): AtomArrays {
    const next = startOfResidue.slice();
    const x = new Float32Array(this.count);
    const y = new Float32Array(this.count);
    const z = new Float32Array(this.count);
    const names = new Array<string>(this.count);
    const elements = new Array<string>(this.count);
    for (let from = 0; from < this.count; from++) {
      const residue = this.residueOf[from] ?? 0;
      const to = next[residue] ?? 0;
      next[residue] = to + 1;
      x[to] = this.x[from] ?? 0;
      y[to] = this.y[from] ?? 0;
      z[to] = this.z[from] ?? 0;
      names[to] = this.names[this.nameOf[from] ?? 0] ?? '';
      elements[to] = this.elements[this.elementOf[from] ?? 0] ?? '';
    }
    return { count: this.count, xAngstrom: x, yAngstrom: y, zAngstrom: z, names, elements };
  }

  private grow(): void {
    this.residueOf = twice(this.residueOf, Int32Array);
    this.nameOf = twice(this.nameOf, Int32Array);
    this.elementOf = twice(this.elementOf, Int32Array);
    this.occupancy = twice(this.occupancy, Float32Array);
    this.x = twice(this.x, Float32Array);
    this.y = twice(this.y, Float32Array);
    this.z = twice(this.z, Float32Array);
    this.alternate = twice(this.alternate, Uint8Array);
  }
}

type Column = Int32Array<ArrayBuffer> | Float32Array<ArrayBuffer> | Uint8Array<ArrayBuffer>;

function twice<T extends Column>(column: T, kind: new (length: number) => T): T {
  const larger = new kind(column.length * 2);
  larger.set(column);
  return larger;
}
