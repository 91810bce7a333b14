import { Banner, Button, KeyValueList, KeyValueRow, Row, Stack } from '@/components/ui';
import { conflictOf, type ApiProblem } from '@/client/problem';
import { mutant as mutantShape, type Mutant } from '@/shared/contracts/plans';
import { codonsOf } from './alternatives';

interface StaleNoticeProps {
  problem: ApiProblem | null;
  /** As it was on the page when the act was sent. */
  seen: Mutant;
  /** Does the same on what stands there now. */
  onAgain: (now: Mutant) => void;
  onLeave: () => void;
}

function stateWords(mutant: Mutant): string {
  const chosen = mutant.designs.find((design) => design.chosen);
  return [
    mutant.state,
    mutant.constructName ?? 'no construct',
    `${mutant.designs.length} designs`,
    chosen ? `design ${chosen.rank} with ${codonsOf(chosen)} chosen` : 'none chosen',
  ].join(', ');
}

/** Somebody else changed the mutant first: both states, and what can be done. */
export function StaleNotice({ problem, seen, onAgain, onLeave }: StaleNoticeProps) {
  const now = conflictOf(problem, mutantShape);
  if (!now) return null;
  return (
    <Stack gap={8}>
      <Banner kind="danger">
        Not done: this mutant was changed by somebody else while you looked at it.
      </Banner>
      <KeyValueList label="Both states">
        <KeyValueRow name="You saw" value={stateWords(seen)} />
        <KeyValueRow name="Stands now" value={stateWords(now)} />
      </KeyValueList>
      <Row wrap>
        <Button onPress={onLeave}>Leave it as it stands now</Button>
        <Button onPress={() => onAgain(now)}>Do mine on top</Button>
      </Row>
    </Stack>
  );
}
