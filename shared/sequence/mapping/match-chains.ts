import { breaksOfChain } from './chain-breaks';
import type { CandidateProtein, ChainMap, MappableChain } from './chain-types';
import { alignChain, describeMap, observedLetters, type ChainAlignment } from './map-chain';
import { DEFAULT_GAP_RULES, type GapRules } from './pairwise';
import { countSharedWords, wordsOf } from './shared-words';

export interface MatchOptions {
  rules: GapRules;
  /** How many proteins of a family, by shared words, are aligned with a chain. */
  alignedPerFamily: number;
  /** Families sharing less than this part of the best family's words get one protein aligned. */
  weakFamilyFraction: number;
}

export const MATCH_OPTIONS: MatchOptions = {
  rules: DEFAULT_GAP_RULES,
  alignedPerFamily: 4,
  weakFamilyFraction: 0.2,
};

/** The maps of one chain on the proteins it was aligned with, best score first. */
export interface ChainMatch {
  chain: MappableChain;
  maps: ChainMap[];
}

/** Candidates worth aligning: the best of each family by shared words, in the order given on ties. */
function worthAligning(
  observed: string,
  families: readonly { protein: CandidateProtein; words: ReadonlySet<string> }[][],
  options: MatchOptions,
): CandidateProtein[] {
  const words = wordsOf(observed);
  const ranked = families.map((members) =>
    members
      .map(({ protein, words: own }) => ({ protein, shared: countSharedWords(words, own) }))
      .sort((a, b) => b.shared - a.shared),
  );
  const best = Math.max(0, ...ranked.map((members) => members[0]?.shared ?? 0));
  return ranked.flatMap((members) => {
    const weak = (members[0]?.shared ?? 0) < best * options.weakFamilyFraction;
    return members.slice(0, weak ? 1 : options.alignedPerFamily).map(({ protein }) => protein);
  });
}

/**
 * Maps each chain on the proteins it may be. Every family is asked (a margin needs a runner-up), but within a
 * family only the proteins that share most words with the chain are aligned; chains with the same letters and
 * breaks are aligned once. Maps are sorted by score, then identity, then the order of the candidates.
 */
export function matchChains(
  chains: readonly MappableChain[],
  candidates: readonly CandidateProtein[],
  options: Partial<MatchOptions> = {},
): ChainMatch[] {
  const all = { ...MATCH_OPTIONS, ...options };
  const byFamily = new Map<string, { protein: CandidateProtein; words: ReadonlySet<string> }[]>();
  for (const protein of candidates) {
    const members = byFamily.get(protein.family) ?? [];
    members.push({ protein, words: wordsOf(protein.residues) });
    byFamily.set(protein.family, members);
  }
  const families = [...byFamily.values()];
  const done = new Map<string, { protein: CandidateProtein; alignment: ChainAlignment }[]>();
  return chains.map((chain) => {
    const observed = observedLetters(chain);
    const breaks = breaksOfChain(chain.residues);
    const key = `${observed} ${breaks.join(',')}`;
    let alignments = done.get(key);
    if (alignments === undefined) {
      alignments = worthAligning(observed, families, all).flatMap((protein) => {
        const alignment = alignChain(observed, breaks, protein.residues, all.rules);
        return alignment === null ? [] : [{ protein, alignment }];
      });
      done.set(key, alignments);
    }
    const maps = alignments.map(({ protein, alignment }) => describeMap(chain, protein, alignment));
    maps.sort((a, b) => b.score - a.score || b.identity - a.identity);
    return { chain, maps };
  });
}
