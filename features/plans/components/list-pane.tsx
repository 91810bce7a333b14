import Plus from 'lucide-react-native/icons/plus';
import { Button, Caption, Empty, Link, Row, Stack, Text } from '@/components/ui';
import { newMutantPath, planPath } from '@/client/paths';
import { useMay } from '@/features/projects';
import type { Mutant } from '@/shared/contracts/plans';
import { MutantList } from './mutant-list';

interface MutantPaneProps {
  projectId: string;
  mutants: readonly Mutant[];
  currentId?: string;
}

/** The mutants of a project, as the first pane beside whichever of them is open. */
export function MutantPane({ projectId, mutants, currentId }: MutantPaneProps) {
  const may = useMay(projectId);
  return (
    <Stack gap={12}>
      <Row justify="between">
        <Text kind="head" heading={2}>
          Mutations
        </Text>
        {may('plan') ? (
          <Button kind="quiet" icon={Plus} href={newMutantPath(projectId)} label="Plan a mutation">
            Add
          </Button>
        ) : null}
      </Row>
      <MutantList projectId={projectId} mutants={mutants} currentId={currentId} />
      <Link href={planPath(projectId)}>Constructs and the primer list</Link>
    </Stack>
  );
}

export function MutantSection({ projectId, mutants }: Pick<MutantPaneProps, 'projectId' | 'mutants'>) {
  const may = useMay(projectId);
  return (
    <Stack gap={4}>
      <Caption count={mutants.length > 0 ? mutants.length : undefined}>Mutations</Caption>
      {mutants.length > 0 ? (
        <MutantList projectId={projectId} mutants={mutants} />
      ) : (
        <Empty title="No mutation planned yet">
          {may('plan')
            ? 'Plan one here, or from the page of the residue it changes. A wish may come before its DNA.'
            : 'Contributors, curators and leads plan mutations; you read here.'}
        </Empty>
      )}
    </Stack>
  );
}
