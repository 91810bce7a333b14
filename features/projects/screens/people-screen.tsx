import { useState } from 'react';
import Settings from 'lucide-react-native/icons/settings';
import UserPlus from 'lucide-react-native/icons/user-plus';
import { projectParams } from '@/shared/contracts/common';
import { PageTitle, Panes, Screen } from '@/components/layout';
import { useLayout } from '@/components/theme';
import { Button, Caption, IconButton, NothingHere, ReadView, Sheet, Stack, Text } from '@/components/ui';
import { findPath, settingsPath } from '@/client/paths';
import { useRouteParams } from '@/client/use-route-params';
import { AddMemberForm } from '../components/add-member-form';
import { MemberList } from '../components/member-list';
import { OwnCorner } from '../components/own-corner';
import { RightsList } from '../components/rights-list';
import { useMembers } from '../use-members';
import { useMay, useProject } from '../use-projects';

/** Who is in a project and in which role, what each role may do, and the way to add somebody. */
export function PeopleScreen() {
  const given = useRouteParams(projectParams);
  return given ? <People projectId={given.projectId} /> : <NothingHere />;
}

function People({ projectId }: { projectId: string }) {
  const { hasRail } = useLayout();
  const { data: project } = useProject(projectId);
  const members = useMembers(projectId);
  const may = useMay(projectId);
  const [adds, setAdds] = useState(false);
  if (!project) return null;
  const mayManage = may('manage members');
  const leads = members.data?.filter(({ role }) => role === 'lead').map(({ name }) => name) ?? [];
  const form = <AddMemberForm projectId={projectId} readersMayComment={project.readersMayComment} />;
  const rights = (
    <RightsList
      key={project.role}
      role={project.role}
      readersMayComment={project.readersMayComment}
      leads={leads}
    />
  );
  const list = (
    <Stack gap={20}>
      <div>
        <PageTitle
          quietOnPhone
          action={
            hasRail ? (
              <Button icon={Settings} href={settingsPath(projectId)}>
                Settings
              </Button>
            ) : undefined
          }
        >
          Members of {project.name}
        </PageTitle>
        <Text tone="soft">A project always has at least one lead.</Text>
      </div>
      <Stack gap={8}>
        <Caption count={members.data?.length}>Members</Caption>
        <ReadView of={members} what="the members">
          {(rows) => (
            <MemberList
              projectId={projectId}
              projectName={project.name}
              members={rows}
              mayManage={mayManage}
            />
          )}
        </ReadView>
      </Stack>
      {mayManage ? rights : null}
      {hasRail ? null : <OwnCorner />}
    </Stack>
  );
  const aside = mayManage ? (
    <Stack gap={16}>
      <Text kind="head" heading={2}>
        Add somebody
      </Text>
      {form}
    </Stack>
  ) : (
    rights
  );
  const items = [
    { key: 'project', label: 'Project', value: project.name },
    { key: 'you', label: 'You', value: project.role },
    { key: 'members', label: 'Members', value: members.data?.length ?? '…' },
  ];
  return (
    <Screen
      kind="panes"
      title="People"
      backHref={findPath(projectId)}
      phoneTools={<IconButton icon={Settings} label="Settings" href={settingsPath(projectId)} />}
      items={items}
      actions={
        mayManage ? (
          <Button kind="primary" icon={UserPlus} onPress={() => setAdds(true)}>
            Add somebody
          </Button>
        ) : undefined
      }
    >
      <Panes
        name="people"
        panes={[
          { key: 'members', label: 'Members', content: list },
          {
            key: 'aside',
            label: mayManage ? 'Add somebody' : 'What may I do here',
            content: aside,
            widthPixels: 420,
            hideWhenStacked: mayManage,
          },
        ]}
      />
      <Sheet open={adds && !hasRail} title="Add somebody" onClose={() => setAdds(false)}>
        {form}
      </Sheet>
    </Screen>
  );
}
