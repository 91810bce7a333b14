import Plus from 'lucide-react-native/icons/plus';
import { Button, Empty, Row, Stack, Text } from '@/components/ui';
import { newMutantPath, planPath } from '@/client/paths';
import { useMay } from '@/features/projects';
import type { Mutant } from '@/shared/contracts/plans';
import { MutantList } from './mutant-list';

interface MutantPaneProps {
  projectId: string;
  mutants: readonly Mutant[];
  currentId?: string;
}

/** The mutants of a project: it stays put while one of them is open beside it. */
export function MutantPane({ projectId, mutants, currentId }: MutantPaneProps) {
  const may = useMay(projectId);
  return (
    <Stack gap={12}>
      <Row justify="between">
        <Text kind="head" heading={2}>
          Mutations
        </Text>
        {currentId && may('plan') ? (
          <Button kind="quiet" icon={Plus} href={newMutantPath(projectId)} label="Add a mutation">
            Add
          </Button>
        ) : null}
      </Row>
      {mutants.length > 0 ? (
        <MutantList projectId={projectId} mutants={mutants} currentId={currentId} />
      ) : (
        <Empty title="No mutation planned yet">
          {may('plan')
            ? 'Plan one here, or from the page of the residue it changes. It can be planned before its DNA is here.'
            : 'Contributors, curators and leads plan mutations; you read here.'}
        </Empty>
      )}
      {currentId ? (
        <Row>
          <Button kind="quiet" href={planPath(projectId)}>
            Constructs and the primer list
          </Button>
        </Row>
      ) : null}
    </Stack>
  );
}
