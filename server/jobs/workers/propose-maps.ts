import type { CandidateProtein, MappableChain } from '../../../shared/sequence/mapping/chain-types';
import { matchChains, type ChainMatch } from '../../../shared/sequence/mapping/match-chains';
import { proposeProtein } from '../../../shared/sequence/mapping/propose-protein';
import type { Chain } from '../../../shared/structure/types';
import type { NewMap } from '../../modules/maps';
import { describeMapping } from './map-rows';
import type { WorkerProgress } from './messages';

/** How many of the nearest proteins are kept with a chain, the proposed one first. */
const candidatesKept = 5;
const pauseMilliseconds = 250;

/** What each protein chain is proposed to be, by chain id; all proteins of the project are asked. */
export function proposeMaps(
  chains: readonly Chain[],
  candidates: readonly CandidateProtein[],
  onProgress: (progress: WorkerProgress) => void,
): Map<string, NewMap> {
  const proteins = chains.filter((chain) => chain.kind === 'protein');
  const proposals = new Map<string, NewMap>();
  let toldAt = 0;
  for (const alike of groupsOfEqualSequence(proteins)) {
    const now = Date.now();
    if (now - toldAt >= pauseMilliseconds) {
      onProgress({ stage: 'map', done: proposals.size, total: proteins.length });
      toldAt = now;
    }
    // Chains of the same letters are given together, so that they are aligned once.
    for (const match of matchChains(alike, candidates)) {
      proposals.set(match.chain.id, proposal(match, candidates));
    }
  }
  return proposals;
}

function groupsOfEqualSequence(chains: readonly Chain[]): MappableChain[][] {
  const groups = new Map<string, Chain[]>();
  for (const chain of chains) groups.set(chain.observed, [...(groups.get(chain.observed) ?? []), chain]);
  return [...groups.values()];
}

/** The nearest proteins; the rival that the words name comes right behind the best, so that lists name the same one. */
function nearestOf(
  { maps }: ChainMatch,
  rival: ChainMatch['maps'][number] | null,
): ChainMatch['maps'][number][] {
  const [best, ...others] = maps.filter((map) => map !== rival);
  if (!rival || !best) return maps.slice(0, candidatesKept);
  return [best, rival, ...others].slice(0, candidatesKept);
}

function proposal(match: ChainMatch, candidates: readonly CandidateProtein[]): NewMap {
  const { outcome, words, family, best, equallyGood, rival } = proposeProtein(match, candidates);
  const nearest = nearestOf(match, rival).map(({ proteinId, identity, coverage }) => ({
    proteinId,
    identity,
    coverage,
  }));
  const chosen = outcome === 'matched' && equallyGood.length === 0 ? best : null;
  if (!chosen)
    return {
      // Below what makes a protein certain, the chain is never mapped by itself.
      familyId: outcome === 'unmatched' ? null : family,
      proteinId: null,
      readiness: 'choose',
      reason: candidates.length === 0 ? 'The project holds no protein yet to compare it with.' : words,
      identity: null,
      coverage: null,
      segments: [],
      exceptions: [],
      candidates: nearest,
    };
  return {
    familyId: family,
    proteinId: chosen.proteinId,
    reason: words,
    ...describeMapping(chosen),
    candidates: nearest,
  };
}
