import { projectParams } from '@/shared/contracts/common';
import { PageTitle, Screen } from '@/components/layout';
import { Banner, KeyValueList, KeyValueRow, Link, NothingHere, Stack } from '@/components/ui';
import { historyPath, peoplePath } from '@/client/paths';
import { useRouteParams } from '@/client/use-route-params';
import { SettingsForm } from '../components/settings-form';
import { motorWords } from '../motor-words.data';
import { useMembers } from '../use-members';
import { useMay, useProject } from '../use-projects';

/** What a project is called and whether its readers may comment; a lead changes both. */
export function SettingsScreen() {
  const given = useRouteParams(projectParams);
  return given ? <Settings projectId={given.projectId} /> : <NothingHere />;
}

function Settings({ projectId }: { projectId: string }) {
  const { data: project } = useProject(projectId);
  const { data: members = [] } = useMembers(projectId);
  const may = useMay(projectId);
  if (!project) return null;
  const mayChange = may('change settings');
  const leads = members.filter(({ role }) => role === 'lead').map(({ name }) => name);
  const items = [
    { key: 'project', label: 'Project', value: project.name },
    { key: 'you', label: 'You', value: project.role },
  ];
  return (
    <Screen title="Settings" backHref={peoplePath(projectId)} items={items} narrow>
      <Stack gap={20}>
        <PageTitle quietOnPhone>Settings of {project.name}</PageTitle>
        <KeyValueList label="What does not change">
          <KeyValueRow name="Team" value={project.teamName} />
          <KeyValueRow name="Motor" value={motorWords[project.motorKind].title} />
          {mayChange ? null : <KeyValueRow name="Name" value={project.name} />}
          {mayChange ? null : (
            <KeyValueRow name="Readers" value={project.readersMayComment ? 'may comment' : 'only read'} />
          )}
        </KeyValueList>
        {mayChange ? (
          <SettingsForm project={project} />
        ) : (
          <Banner announce={false}>
            {`Settings are changed by a lead${leads.length > 0 ? `: ${leads.join(', ')}` : ''}.`}
          </Banner>
        )}
        <p>
          <Link href={peoplePath(projectId)} className="lone-link">
            People and what they may do
          </Link>
        </p>
        <p>
          <Link href={historyPath(projectId)} className="lone-link">
            History: who did what
          </Link>
        </p>
      </Stack>
    </Screen>
  );
}
