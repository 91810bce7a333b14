import type { ChainMap } from '@/shared/contracts/maps';
import { Banner } from '@/components/ui';
import type { ApiProblem } from '@/client/problem';

interface DecisionProblemProps {
  problem: ApiProblem | null;
  conflict: ChainMap | null;
}

/** Why a decision was not taken; when somebody else was first, what stands there now. */
export function DecisionProblem({ problem, conflict }: DecisionProblemProps) {
  if (conflict) {
    const who = conflict.decidedBy ? ` by ${conflict.decidedBy.name}` : '';
    const what = conflict.organism ? `, as ${conflict.organism}` : '';
    return (
      <Banner kind="warn">
        <b>{`Chain ${conflict.authorId} was decided meanwhile.`}</b>{' '}
        {`It is ${conflict.status ?? 'open'} now${who}${what}. Look at it, then decide again if that is wrong.`}
      </Banner>
    );
  }
  return problem ? <Banner kind="danger">{problem.message}</Banner> : null;
}
