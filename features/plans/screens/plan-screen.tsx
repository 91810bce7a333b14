import Plus from 'lucide-react-native/icons/plus';
import { PageTitle, Panes, Screen } from '@/components/layout';
import { useLayout } from '@/components/theme';
import { Button, Caption, counted, Empty, NothingHere, ReadView, Row, Stack, Text } from '@/components/ui';
import { newConstructPath, newMutantPath } from '@/client/paths';
import { useRouteParams } from '@/client/use-route-params';
import { useFamilies } from '@/features/families';
import { useMay } from '@/features/projects';
import { projectParams } from '@/shared/contracts/common';
import type { Construct, Mutant } from '@/shared/contracts/plans';
import { leadingDesign } from '../check-words';
import { Caution } from '../components/caution';
import { ConstructList } from '../components/construct-list';
import { ExportButton } from '../components/export-primers';
import { MutantPane } from '../components/list-pane';
import { concentrationWords } from '../condition-words';
import { usePlan } from '../use-plan';

export function PlanScreen() {
  const given = useRouteParams(projectParams);
  if (!given) return <NothingHere />;
  return <Plan projectId={given.projectId} />;
}

function Plan({ projectId }: { projectId: string }) {
  const plan = usePlan(projectId);
  const { hasRail } = useLayout();
  const mutants = plan.data?.mutants ?? [];
  const may = useMay(projectId);
  const actions = may('plan') ? (
    <PlanActions projectId={projectId} empty={plan.data?.constructs.length === 0} />
  ) : undefined;
  return (
    <Screen
      title="Plan"
      kind="panes"
      actions={actions}
      items={[
        { key: 'numbering', label: 'Numbering', value: numberingWords(mutants) },
        { key: 'constructs', label: 'Constructs', value: plan.data?.constructs.length ?? '' },
        { key: 'conditions', label: 'Conditions', value: concentrationWords() },
      ]}
    >
      <Panes
        name="plan"
        panes={[
          {
            key: 'mutants',
            label: 'Mutations',
            widthPixels: 320,
            content: (
              <ReadView of={plan} what="the plans">
                {(read) => <MutantPane projectId={projectId} mutants={read.mutants} />}
              </ReadView>
            ),
          },
          {
            key: 'constructs',
            label: 'Constructs and primers',
            content: plan.data ? (
              <Stack gap={20} style={{ maxWidth: 720 }}>
                <PageTitle quietOnPhone action={hasRail && actions ? <Row wrap>{actions}</Row> : null}>
                  Plan
                </PageTitle>
                <Constructs projectId={projectId} constructs={plan.data.constructs} />
                <PrimerList projectId={projectId} mutants={mutants} />
              </Stack>
            ) : null,
          },
        ]}
      />
    </Screen>
  );
}

/** The next step is the primary one: a construct first, then mutations. */
function PlanActions({ projectId, empty }: { projectId: string; empty: boolean }) {
  const { hasRail } = useLayout();
  const icon = hasRail ? Plus : undefined;
  const addConstruct = (
    <Button key="construct" kind={empty ? 'primary' : 'plain'} icon={icon} href={newConstructPath(projectId)}>
      Add a construct
    </Button>
  );
  const planMutation = (
    <Button key="mutation" kind={empty ? 'plain' : 'primary'} icon={icon} href={newMutantPath(projectId)}>
      Plan a mutation
    </Button>
  );
  return empty ? [addConstruct, planMutation] : [planMutation, addConstruct];
}

function Constructs({ projectId, constructs }: { projectId: string; constructs: readonly Construct[] }) {
  const families = useFamilies(projectId).data;
  return (
    <Stack gap={4}>
      <Caption count={constructs.length > 0 ? constructs.length : undefined}>Constructs</Caption>
      {constructs.length > 0 ? (
        <ConstructList
          projectId={projectId}
          constructs={constructs}
          partOf={(familyId) => families?.find(({ id }) => id === familyId)?.part}
        />
      ) : (
        <Empty title="No construct yet">
          Paste the lab’s coding DNA, best the whole plasmid, and say where the coding part starts. It must
          encode a protein of this project.
        </Empty>
      )}
    </Stack>
  );
}

function PrimerList({ projectId, mutants }: { projectId: string; mutants: readonly Mutant[] }) {
  const listed = mutants.flatMap(({ designs }) => leadingDesign(designs) ?? []);
  const primers = listed.reduce((sum, design) => sum + design.primers.length, 0);
  return (
    <Stack gap={12}>
      <Caption count={`${primers} primers of ${counted(listed.length, 'mutant')}`}>Primer list</Caption>
      <Text tone="soft">
        The chosen design of each mutant, or its best one where none is chosen; only designs whose product was
        read back.
      </Text>
      <Caution />
      <Row>
        <ExportButton
          projectId={projectId}
          offReason={primers === 0 ? 'No primers to export: design some for a mutant' : undefined}
        />
      </Row>
    </Stack>
  );
}

function numberingWords(mutants: readonly Mutant[]): string {
  const names = new Set(
    mutants.flatMap(({ mutations }) => mutations.map(({ residue }) => residue.numbering)),
  );
  if (names.size === 0) return 'as each protein prefers';
  return names.size === 1 ? [...names].join('') : `as each protein prefers: ${[...names].join(', ')}`;
}
