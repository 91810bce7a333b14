import type { AtomRow, AtomTable } from './atom-table';
import type { DraftResidue } from './draft';

/**
 * Adds atoms to a table with one position each. An atom that comes again in its residue under another alternate
 * mark is an alternate position: the one with the highest occupancy is kept, the first on ties. Under the same
 * mark, or both without one, it is a duplicate and left out. Format-independent.
 */
export class AlternateChooser {
  /** For each name: the residue it was last added to, and where. Keeps the search for an earlier position at one look. */
  private readonly lastResidue: number[] = [];
  private readonly lastAtom: number[] = [];
  /** By atom: it came in more than one position. */
  private readonly multiple = new Set<number>();
  /** First atom of each residue: its atoms stand together until it is left for the first time. */
  private readonly firstAtom: number[] = [];
  /** Atoms by name of residues that were left and came back. */
  private readonly returned = new Map<number, Map<number, number>>();
  private open = -1;
  private openByName: Map<number, number> | undefined;

  constructor(
    private readonly table: AtomTable,
    private readonly residues: readonly DraftResidue[],
  ) {}

  /** Makes a residue the one that the next atoms belong to. */
  openResidue(residue: number): void {
    this.open = residue;
    if (this.firstAtom[residue] === undefined) {
      this.firstAtom[residue] = this.table.count;
      this.openByName = undefined;
    } else this.openByName = this.byName(residue);
  }

  /** False when the atom is a duplicate. */
  add(atom: AtomRow): boolean {
    const at = this.find(atom.name);
    const residue = this.residues[this.open];
    if (!residue) return false;
    if (at < 0) {
      const index = this.table.append(this.open, atom);
      this.lastResidue[atom.name] = this.open;
      this.lastAtom[atom.name] = index;
      this.openByName?.set(atom.name, index);
      residue.atomCount++;
      return true;
    }
    if (atom.alternate === this.table.alternate[at]) return false;
    if (!this.multiple.has(at)) {
      this.multiple.add(at);
      residue.alternates++;
    }
    if (atom.occupancy > (this.table.occupancy[at] ?? 0)) this.table.put(at, atom);
    return true;
  }

  private find(name: number): number {
    if (this.openByName) return this.openByName.get(name) ?? -1;
    return this.lastResidue[name] === this.open ? (this.lastAtom[name] ?? -1) : -1;
  }

  private byName(residue: number): Map<number, number> {
    const known = this.returned.get(residue);
    if (known) return known;
    const atoms = new Map<number, number>();
    const { count, residueOf, nameOf } = this.table;
    for (let at = this.firstAtom[residue] ?? count; at < count && residueOf[at] === residue; at++) {
      atoms.set(nameOf[at] ?? 0, at);
    }
    this.returned.set(residue, atoms);
    return atoms;
  }
}
