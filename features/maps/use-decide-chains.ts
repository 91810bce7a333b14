import { useState } from 'react';
import type { z } from 'zod';
import { chainMap, type ChainMap, type mapDecisionBody } from '@/shared/contracts/maps';
import { liveProjects } from '@/client/live-projects';
import { conflictOf, type ApiProblem } from '@/client/problem';
import { useDecideMap } from './use-maps';

export type MapDecision = z.input<typeof mapDecisionBody>;

export interface DecideChains {
  decide: (chains: readonly ChainMap[], body: MapDecision) => void;
  /** While they are decided, one after the other. */
  progress: { done: number; total: number } | null;
  /** Chain ids of the last decision. */
  about: readonly string[];
  problem: ApiProblem | null;
  /** What stands there now, when somebody else decided first. */
  conflict: ChainMap | null;
}

/** The same decision for chains that are alike. It stops at the first that is refused. */
export function useDecideChains(projectId: string): DecideChains {
  const { mutateAsync, error } = useDecideMap(projectId);
  const [progress, setProgress] = useState<DecideChains['progress']>(null);
  const [about, setAbout] = useState<readonly string[]>([]);
  const run = async (chains: readonly ChainMap[], body: MapDecision) => {
    setAbout(chains.map(({ chainId }) => chainId));
    let next = body;
    for (const [at, { chainId, version }] of chains.entries()) {
      setProgress({ done: at, total: chains.length });
      const decided = await mutateAsync({ chainId, version, body: next });
      // The first chain brought the protein; the others lie on it.
      if (next.decision === 'add protein' && decided.proteinId)
        next = { decision: 'correct', proteinId: decided.proteinId };
    }
  };
  const conflict = conflictOf(error, chainMap);
  return {
    decide: (chains, body) =>
      void run(chains, body)
        .catch((refused: unknown) => {
          const payload = conflictOf(refused, chainMap);
          if (payload) liveProjects.tell(projectId, [{ kind: 'map.decided', payload }]);
        })
        .finally(() => setProgress(null)),
    progress,
    about,
    problem: error,
    conflict,
  };
}
