import { Caption, CheckList, Stack } from '@/components/ui';
import type { Design, Mutant } from '@/shared/contracts/plans';
import { linesOfDesign, summaryOf } from '../check-words';
import { ChangePlates } from './change-plates';

/** What was checked, each with its value and limit; the proof comes last. */
export function DesignChecks({ design, mutant }: { design: Design; mutant: Mutant }) {
  const lines = linesOfDesign(design);
  const shown = lines.map((line) =>
    line.key === 'read-back' && design.proved
      ? { ...line, value: <ChangePlates mutations={mutant.mutations} size={22} /> }
      : line,
  );
  return (
    <Stack gap={4}>
      <Caption count={summaryOf(lines)}>Checks</Caption>
      <CheckList label="Checks of this design" checks={shown} />
    </Stack>
  );
}
