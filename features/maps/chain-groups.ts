import type { ChainMap } from '@/shared/contracts/maps';
import { chainNames } from './chain-names';

/** How a chain stands for the person who confirms maps; in the order in which it needs them. */
export const standings = ['choose', 'look', 'ready', 'decided', 'left out', 'no protein'] as const;
export type Standing = (typeof standings)[number];

/** Chains that are matched in the same way and stand the same: they are looked at, and decided, together. */
export interface ChainGroup {
  key: string;
  standing: Standing;
  /** The one that stands for all. */
  first: ChainMap;
  chains: readonly ChainMap[];
  /** `A to I` */
  names: string;
}

export function standingOf({ status, readiness }: Pick<ChainMap, 'status' | 'readiness'>): Standing {
  if (status === null) return 'no protein';
  if (status === 'left out') return 'left out';
  if (status !== 'proposed') return 'decided';
  return readiness === 'none' ? 'choose' : readiness;
}

/** What must be equal for two chains to be one row. */
function sameness(chain: ChainMap): string {
  const { kind, readiness, familyId, proteinId, identity, coverage, reason, segments } = chain;
  // Where nothing is near, the sequence itself and its numbers have to be alike.
  const unmatched = [reason, chain.sequenceKey, chain.firstLabel, chain.lastLabel];
  const exceptions = chain.exceptions.map((one) => [one.kind, one.label, one.chainLetter, one.residueIndex]);
  const standing = standingOf(chain);
  const alike = { kind, standing, readiness, familyId, proteinId, identity, coverage, segments, exceptions };
  return JSON.stringify({ ...alike, unmatched: proteinId ? null : unmatched });
}

/** Groups in the order in which they need a person; within that in the order of the file. */
export function groupChains(chains: readonly ChainMap[]): ChainGroup[] {
  const groups = new Map<string, ChainMap[]>();
  for (const chain of chains) {
    const key = sameness(chain);
    const group = groups.get(key);
    if (group) group.push(chain);
    else groups.set(key, [chain]);
  }
  return [...groups.values()]
    .flatMap((alike) => {
      const [first] = alike;
      if (!first) return [];
      const names = chainNames(alike.map(({ authorId }) => authorId));
      return [{ key: first.chainId, standing: standingOf(first), first, chains: alike, names }];
    })
    .sort((one, other) => standings.indexOf(one.standing) - standings.indexOf(other.standing));
}

/** How alike chains were decided, in one word. */
export function decidedWord({ chains }: Pick<ChainGroup, 'chains'>): string {
  const words = new Set(chains.map(({ status }) => status));
  return (words.size === 1 ? chains[0]?.status : null) ?? 'decided';
}

/** How many chains stand so. */
export const countOf = (groups: readonly ChainGroup[], standing: Standing): number =>
  groups.reduce((sum, group) => (group.standing === standing ? sum + group.chains.length : sum), 0);

const expected = new Set<ChainMap['exceptions'][number]['kind']>(['modified', 'tag']);

/** Exceptions that a person should look at; a modified residue or a tag is no doubt. */
export const doubts = ({ exceptions }: ChainMap): ChainMap['exceptions'] =>
  exceptions.filter(({ kind }) => !expected.has(kind));

export const mismatchCount = ({ exceptions }: ChainMap): number =>
  exceptions.filter(({ kind }) => kind === 'mismatch' || kind === 'engineered').length;

/** The nearest protein besides the proposed one, of another family where there is one; null when nothing is near. */
export function runnerUp({
  candidates,
  proteinId,
  familyId,
}: ChainMap): ChainMap['candidates'][number] | null {
  const others = candidates.filter((candidate) => candidate.proteinId !== proteinId);
  return others.find((candidate) => candidate.familyId !== familyId) ?? others[0] ?? null;
}
