import { Caption, CheckList, Stack } from '@/components/ui';
import type { Design, Mutant } from '@/shared/contracts/plans';
import { checkLines, summaryOf } from '../check-words';
import { ChangePlates } from './change-plates';

/** What was checked, each with its value and limit; the proof comes last. */
export function DesignChecks({ design, mutant }: { design: Design; mutant: Mutant }) {
  const lines = checkLines(design.checks);
  const proof = {
    result: design.proved ? ('passed' as const) : ('failed' as const),
    name: 'Read back from the DNA',
    value: design.proved ? <ChangePlates mutations={mutant.mutations} size={22} /> : 'not proved',
    limit: design.proof,
  };
  return (
    <Stack gap={4}>
      <Caption count={summaryOf([...lines, proof])}>Checks</Caption>
      <CheckList label="Checks of this design" checks={[...lines, proof]} />
    </Stack>
  );
}
