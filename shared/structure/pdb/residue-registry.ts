import type { DraftChain, DraftResidue } from '../draft';
import type { IssueList } from '../issue-list';
import { WATER_NAMES } from '../residue-names.data';
import { BLANK } from './columns';

/** What columns 17–27 of an atom line say. */
export interface ResidueFields {
  name: string;
  chain: string;
  authorNumber: number;
  insertionCode: string;
  hetero: boolean;
  /** Code of the alternate mark, a blank for none. */
  alternate: number;
  line: number;
}

interface KnownResidues {
  polymer: Map<number, number>;
  waters: Map<number, number>;
  /** By number and name. */
  others: Map<string, number>;
}

/**
 * Chains and residues of one model in file order. A residue is (chain, number, insertion code); after the end (TER)
 * of its chain and among waters the name counts too, so that a ligand may share a polymer residue's number.
 */
export class ResidueRegistry {
  readonly chains: DraftChain[] = [];
  readonly residues: DraftResidue[] = [];
  private readonly chainIndices = new Map<string, number>();
  private readonly known: KnownResidues[] = [];

  constructor(private readonly issues: IssueList) {}

  /** TER: what follows in this chain is after the end of its polymer. */
  endPolymer(chainId: string): void {
    const chain = this.chains[this.chainIndices.get(chainId) ?? -1];
    if (chain) chain.segment++;
  }

  /** The residue these fields belong to, a new one if need be; null when the atom must be left out. */
  find(fields: ResidueFields): number | null {
    const chainIndex = this.chainIndex(fields.chain);
    const chain = this.chains[chainIndex];
    const known = this.known[chainIndex];
    if (!chain || !known) return null;
    const key = (fields.authorNumber + 1000) * 256 + (fields.insertionCode.charCodeAt(0) || 0);
    if (WATER_NAMES.has(fields.name)) {
      return known.waters.get(key) ?? this.add(fields, chainIndex, chain.waters, known.waters, key);
    }
    if (!fields.hetero || chain.segment === 0) {
      const index = known.polymer.get(key);
      if (index === undefined) return this.add(fields, chainIndex, chain.residues, known.polymer, key);
      const residue = this.residues[index];
      if (residue?.name === fields.name) return index;
      if (residue && this.isOtherName(fields, residue)) return null;
    }
    const withName = `${key}|${fields.name}`;
    return known.others.get(withName) ?? this.add(fields, chainIndex, chain.residues, known.others, withName);
  }

  /** A second name for one residue: told, and its atoms left out. A ligand before TER with a used number is its own. */
  private isOtherName(fields: ResidueFields, residue: DraftResidue): boolean {
    const label = `${fields.authorNumber}${fields.insertionCode}`;
    const where = { line: fields.line, column: 18, chain: fields.chain, residue: label };
    if (fields.alternate !== BLANK && residue.marked) {
      this.issues.warn(
        'microheterogeneity',
        `Residue ${label} is ${residue.name} and ${fields.name} at once; ${residue.name}, the first, is kept.`,
        where,
      );
      return true;
    }
    if (fields.hetero !== residue.hetero) return false;
    this.issues.warn(
      'residue-name-changes',
      `Residue ${label} was ${residue.name} and is ${fields.name} here; this atom is left out.`,
      where,
    );
    return true;
  }

  private chainIndex(id: string): number {
    const known = this.chainIndices.get(id);
    if (known !== undefined) return known;
    const index = this.chains.push({ id, labelIds: [], residues: [], waters: [], segment: 0 }) - 1;
    this.known.push({ polymer: new Map(), waters: new Map(), others: new Map() });
    this.chainIndices.set(id, index);
    return index;
  }

  private add<K>(
    fields: ResidueFields,
    chain: number,
    list: number[],
    known: Map<K, number>,
    key: K,
  ): number {
    const index =
      this.residues.push({
        chain,
        authorNumber: fields.authorNumber,
        insertionCode: fields.insertionCode,
        name: fields.name,
        hetero: fields.hetero,
        segment: this.chains[chain]?.segment ?? 0,
        line: fields.line,
        atomCount: 0,
        alternates: 0,
        marked: false,
        zeroOccupancyLine: 0,
      }) - 1;
    list.push(index);
    known.set(key, index);
    return index;
  }
}
