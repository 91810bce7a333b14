import Plus from 'lucide-react-native/icons/plus';
import { z } from 'zod';
import { FamilyTag } from '@/components/residue';
import { PageTitle, Panes, Screen } from '@/components/layout';
import { useLayout } from '@/components/theme';
import {
  Button,
  Caption,
  CopyButton,
  Empty,
  IssueList,
  KeyValueList,
  KeyValueRow,
  Link,
  Loading,
  NothingHere,
  ReadView,
  Row,
  Stack,
  Time,
} from '@/components/ui';
import { newMutantPath, planPath, proteinPath } from '@/client/paths';
import { useRouteParams } from '@/client/use-route-params';
import { useFamilies, useProtein } from '@/features/families';
import { useMay } from '@/features/projects';
import type { Construct, Mutant } from '@/shared/contracts/plans';
import { baseRange } from '../codon-rows';
import { CodonTable } from '../components/codon-table';
import { MutantList } from '../components/mutant-list';
import { issueViews } from '../components/refusal';
import { TagWords } from '../components/tag-words';
import { geneticCodeWords } from '../condition-words';
import { tagsOfConstruct } from '../construct-tags';
import { usePlan } from '../use-plan';

const params = z.object({ projectId: z.uuid(), constructId: z.uuid() });

export function ConstructScreen() {
  const given = useRouteParams(params);
  if (!given) return <NothingHere />;
  return <ReadConstruct {...given} />;
}

function ReadConstruct({ projectId, constructId }: z.output<typeof params>) {
  const plan = usePlan(projectId);
  const construct = plan.data?.constructs.find(({ id }) => id === constructId);
  if (!plan.data || !construct) {
    return (
      <Screen title="Construct" backHref={planPath(projectId)}>
        <ReadView of={plan} what="the construct">
          {() => <NothingHere />}
        </ReadView>
      </Screen>
    );
  }
  const mutants = plan.data.mutants.filter((mutant) => mutant.constructId === constructId);
  return <OpenConstruct {...{ projectId, construct, mutants }} />;
}

interface OpenConstructProps {
  projectId: string;
  construct: Construct;
  mutants: readonly Mutant[];
}

function OpenConstruct({ projectId, construct, mutants }: OpenConstructProps) {
  const { hasRail } = useLayout();
  const may = useMay(projectId);
  const protein = useProtein(projectId, construct.proteinId).data;
  const part =
    useFamilies(projectId).data?.find(({ id }) => id === construct.familyId)?.part ?? ('other' as const);
  const size = construct.bases.length;
  const coding = baseRange(construct.codingStart, construct.codingLength, size);
  const { proteinId, id: constructId } = construct;
  const action = may('plan') ? (
    <Button
      kind="primary"
      icon={Plus}
      full={!hasRail}
      href={newMutantPath(projectId, { proteinId, constructId })}
    >
      Plan a mutation
    </Button>
  ) : undefined;
  return (
    <Screen
      title={construct.name}
      backHref={planPath(projectId)}
      kind="panes"
      actions={action}
      items={[
        { key: 'numbering', label: 'Numbering', value: protein?.preferredNumbering ?? '' },
        { key: 'construct', label: 'Construct', value: `${construct.name}, ${size} bp` },
        { key: 'code', label: 'Code', value: geneticCodeWords(construct.geneticCode) },
        { key: 'coding', label: 'Coding part', value: `bases ${coding}, from 1` },
      ]}
    >
      <Panes
        name="construct"
        panes={[
          {
            key: 'construct',
            label: 'The construct',
            widthPixels: 440,
            content: (
              <Stack gap={20}>
                <PageTitle quietOnPhone>{construct.name}</PageTitle>
                <Facts {...{ projectId, construct, coding, part }} />
                <TagSection construct={construct} />
                {construct.issues.length > 0 ? (
                  <Stack gap={4}>
                    <Caption count={construct.issues.length}>To look at</Caption>
                    <IssueList label="Doubts about this construct" issues={issueViews(construct.issues)} />
                  </Stack>
                ) : null}
                <Stack gap={4}>
                  <Caption count={mutants.length > 0 ? mutants.length : undefined}>Planned in it</Caption>
                  {mutants.length > 0 ? (
                    <MutantList projectId={projectId} mutants={mutants} label="Mutants in this construct" />
                  ) : (
                    <Empty title="No mutation planned in it yet">
                      Plan one here: its codon is found through the map below.
                    </Empty>
                  )}
                </Stack>
                {hasRail && action ? <Row>{action}</Row> : null}
              </Stack>
            ),
          },
          {
            key: 'codons',
            label: 'Codons and residues',
            content: protein ? (
              <CodonTable {...{ projectId, construct, protein, part }} />
            ) : (
              <Loading>Reading the protein</Loading>
            ),
          },
        ]}
      />
    </Screen>
  );
}

function TagSection({ construct }: { construct: Construct }) {
  const tags = tagsOfConstruct(construct);
  return tags.length > 0 ? <TagWords tags={tags} /> : null;
}

type FactsProps = Pick<OpenConstructProps, 'projectId' | 'construct'> & {
  coding: string;
  part: Parameters<typeof FamilyTag>[0]['part'];
};

function Facts({ projectId, construct, coding, part }: FactsProps) {
  return (
    <KeyValueList label="The construct">
      <KeyValueRow
        name="Encodes"
        value={
          <Row gap={8} justify="end" wrap>
            <FamilyTag family={construct.family} part={part} />
            <Link
              href={proteinPath(projectId, construct.proteinId)}
              style={{ display: 'inline-flex', alignItems: 'center', minHeight: 'var(--hit)' }}
            >
              <em>{construct.organism}</em>
            </Link>
          </Row>
        }
      />
      <KeyValueRow
        name="DNA"
        value={`${construct.bases.length} bases, ${construct.circular ? 'circular' : 'linear'}`}
      />
      <KeyValueRow name="Coding part, with the stop" value={`bases ${coding}`} />
      <KeyValueRow name="Genetic code" value={geneticCodeWords(construct.geneticCode)} />
      <KeyValueRow name="Residues encoded" value={construct.encoded.length} />
      <KeyValueRow
        name="Added"
        value={
          <>
            {`${construct.by.name}, `}
            <Time iso={construct.at} />
          </>
        }
      />
      <KeyValueRow
        name="All bases"
        value={<CopyButton text={construct.bases} label={`Copy the bases of ${construct.name}`} />}
      />
    </KeyValueList>
  );
}
