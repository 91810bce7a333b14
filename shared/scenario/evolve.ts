import type { Block, FamilyPlan, LengthChange } from './families.data';
import type { Branch } from './organisms.data';
import type { Random } from './random';
import { alike, drawFrom, pace, type Surrounding } from './substitutions.data';

/** One column of the true alignment: where the residues of all rows come from one residue of an ancestor. */
export interface Site {
  block: string;
  /** Offset in the block's template; null for a later insertion. */
  offset: number | null;
  surrounding: Surrounding;
  /** Never substituted. */
  fixed: boolean;
  /** Own pace of the site, about 1. */
  pace: number;
}

/** Letter of each site that a lineage holds; a site missing here is a gap. */
export type Lineage = Map<Site, string>;

export interface Evolved {
  /** True columns in order, those that no tip holds left out. */
  sites: Site[];
  /** By organism. */
  tips: Map<string, Lineage>;
}

const paces = [0.15, 0.5, 1, 1, 1.5, 1.85];
const similarShare = 0.78;

/**
 * Evolves an invented ancestor along a tree by substitution, insertion and deletion, and keeps which residue comes from
 * which, so that the alignment of the tips is known and not estimated.
 */
export function evolve(plan: FamilyPlan, tree: Branch, random: Random): Evolved {
  const sites: Site[] = [];
  const ancestor: Lineage = new Map();
  for (const block of plan.blocks) addBlock(block, sites, ancestor, random);
  const tips = new Map<string, Lineage>();
  const walk = (branch: Branch, parent: Lineage): void => {
    const lineage: Lineage = new Map(parent);
    substitute(lineage, branch.length, random);
    for (const change of plan.lengthChanges) {
      if (change.branch === branch.name) changeLength(change, sites, lineage, random);
    }
    if (branch.children.length === 0) tips.set(branch.name, lineage);
    for (const child of branch.children) walk(child, lineage);
  };
  walk(tree, ancestor);
  const held = [...tips.values()];
  return { sites: sites.filter((site) => held.some((lineage) => lineage.has(site))), tips };
}

function addBlock(block: Block, sites: Site[], ancestor: Lineage, random: Random): void {
  [...block.template].forEach((sign, offset) => {
    const fixed = sign === sign.toUpperCase();
    const surrounding = (fixed ? 'h' : sign) as Surrounding;
    const site: Site = { block: block.name, offset, surrounding, fixed, pace: random.pick(paces) };
    sites.push(site);
    ancestor.set(site, fixed ? sign : random.pick(drawFrom[surrounding]));
  });
}

function substitute(lineage: Lineage, length: number, random: Random): void {
  for (const [site, letter] of lineage) {
    if (site.fixed || random.fraction() >= length * site.pace * pace[site.surrounding]) continue;
    const similar = [...(alike[letter] ?? '')].filter((other) => drawFrom[site.surrounding].includes(other));
    const choices =
      similar.length > 0 && random.fraction() < similarShare ? similar : drawFrom[site.surrounding];
    lineage.set(site, random.pick(choices));
  }
}

function changeLength(change: LengthChange, sites: Site[], lineage: Lineage, random: Random): void {
  const at = 'insert' in change ? change.after : change.at;
  const start = sites.findIndex((site) => site.block === change.block && site.offset === at);
  if ('insert' in change) {
    const added = [...change.insert].map((sign): Site => {
      const surrounding = sign as Surrounding;
      return { block: change.block, offset: null, surrounding, fixed: false, pace: 1 };
    });
    sites.splice(start + 1, 0, ...added);
    for (const site of added) lineage.set(site, random.pick(drawFrom[site.surrounding]));
    return;
  }
  for (const site of sites) {
    const { offset } = site;
    if (site.block !== change.block || offset === null) continue;
    if (offset >= at && offset < at + change.remove) lineage.delete(site);
  }
}
