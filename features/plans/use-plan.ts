import type { Construct, Mutant } from '@/shared/contracts/plans';
import type { ReadState } from '@/components/ui';
import { useConstructs, useMutants } from './use-plans';

/** Everything planned in a project, read together. */
export function usePlan(projectId: string): ReadState<{ mutants: Mutant[]; constructs: Construct[] }> {
  const mutants = useMutants(projectId);
  const constructs = useConstructs(projectId);
  return {
    data:
      mutants.data && constructs.data ? { mutants: mutants.data, constructs: constructs.data } : undefined,
    error: mutants.error ?? constructs.error,
    refetch: () => Promise.all([mutants.refetch(), constructs.refetch()]),
  };
}
