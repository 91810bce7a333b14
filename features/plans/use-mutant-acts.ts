import { useState } from 'react';
import type { Design, Mutant } from '@/shared/contracts/plans';
import type { DesignRequest } from './components/design-form';
import { useChooseDesign, useDesign, useMutant } from './use-plans';

type LastAct = { seen: Mutant; repeat: (now: Mutant) => void };

/** Designing and choosing on one mutant, with what to do when somebody else was first. */
export function useMutantActs(projectId: string, mutant: Mutant) {
  const { refetch } = useMutant(projectId, mutant.id);
  const designing = useDesign(projectId);
  const choosing = useChooseDesign(projectId);
  const [last, setLast] = useState<LastAct>();

  const design = (request: DesignRequest, on = mutant) => {
    choosing.reset();
    setLast({ seen: on, repeat: (now) => design(request, now) });
    designing.mutate({ mutantId: on.id, version: on.version, body: request });
  };
  const choose = ({ id }: Pick<Design, 'id'>, on = mutant) => {
    designing.reset();
    setLast({ seen: on, repeat: (now) => choose({ id }, now) });
    choosing.mutate({ mutantId: on.id, version: on.version, designId: id });
  };
  return {
    design,
    choose,
    isDesigning: designing.isPending,
    isChoosing: choosing.isPending,
    problem: designing.error ?? choosing.error,
    refusedWhat: designing.error ? 'No primers' : 'Not chosen',
    last,
    leave: () => {
      designing.reset();
      choosing.reset();
      void refetch();
    },
  };
}
