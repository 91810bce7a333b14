import type { OwnProject } from '@/shared/contracts/projects';
import { FamilyTag, partWords } from '@/components/residue';
import { useLayout } from '@/components/theme';
import { PageTitle } from '@/components/layout';
import { Empty, Row, Stack, Text } from '@/components/ui';
import { familyPath, newUploadPath, peoplePath } from '@/client/paths';
import type { Holdings } from '../use-holdings';
import type { Sample } from '../use-sample';
import { AskCurators } from './ask-curators';
import { FamiliesCaption } from './families-caption';
import { NextStep } from './next-step';
import { StartSteps, type StartStep } from './start-steps';

interface StartProps {
  project: OwnProject;
  holdings: Holdings;
  mayUpload: boolean;
  sample: Sample | null;
}

function stepsOf({ project, holdings, mayUpload }: Omit<StartProps, 'sample'>): StartStep[] {
  const { families, members } = holdings;
  const names = members.map(({ name }) => name);
  const alone = names.length < 2;
  const upload = (kind: 'alignment' | 'structure') =>
    mayUpload ? newUploadPath(project.id, kind) : undefined;
  return [
    {
      key: 'project',
      title: 'Team and project',
      detail: `${project.teamName}, ${project.motorKind}-type, ${families.length} families`,
      state: 'done',
    },
    {
      key: 'people',
      title: 'People',
      detail: alone ? 'only you so far' : names.slice(0, 3).join(', ') + moreWords(names.length - 3),
      state: alone ? 'later' : 'done',
      href: peoplePath(project.id),
    },
    {
      key: 'alignment',
      title: 'An alignment',
      detail: 'turns rows into proteins',
      state: 'next',
      href: upload('alignment'),
    },
    {
      key: 'coordinates',
      title: 'Coordinates',
      detail: 'chains, copies, author numbers',
      state: 'later',
      href: upload('structure'),
    },
    { key: 'pin', title: 'First pin', detail: 'a fact on a residue', state: 'later' },
  ];
}

const moreWords = (count: number): string => (count > 0 ? ` and ${count} more` : '');

/** A project without an alignment or coordinates: five steps, the one that comes next, and a sample to try it with. */
export function Start(props: StartProps) {
  const { project, holdings, mayUpload } = props;
  const { hasRail } = useLayout();
  return (
    <div
      style={{
        display: 'grid',
        gridTemplateColumns: hasRail ? 'minmax(280px,380px) minmax(0,726px)' : 'minmax(0,1fr)',
        gap: hasRail ? '24px 44px' : 24,
        alignItems: 'start',
      }}
    >
      <div>
        <PageTitle large>Start</PageTitle>
        <Text tone="soft">Five steps, in this order or later.</Text>
        <div style={{ paddingTop: 12 }}>
          <StartSteps steps={stepsOf(props)} />
        </div>
      </div>
      <Stack gap={24}>
        {mayUpload ? (
          <NextStep projectId={project.id} sample={props.sample} />
        ) : (
          <AskCurators members={holdings.members} />
        )}
        <Stack gap={8}>
          <FamiliesCaption projectId={project.id} count={`${project.motorKind}-type`} />
          <Row wrap gap={8}>
            {holdings.families.map(({ id, name, part, description }) => (
              <div
                key={id}
                style={{ display: 'flex', gap: 8, alignItems: 'center', flex: '1 1 150px', minHeight: 44 }}
              >
                <FamilyTag family={name} part={part} href={familyPath(project.id, id)} />
                <Text kind="small">{description || partWords[part]}</Text>
              </div>
            ))}
          </Row>
        </Stack>
        <Empty title="No residues yet">
          They come with the first alignment: each row becomes a protein, each letter a residue that can be
          pinned.
        </Empty>
      </Stack>
    </div>
  );
}
