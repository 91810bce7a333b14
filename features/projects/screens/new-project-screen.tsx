import { useRouter } from 'expo-router';
import { EntryFrame } from '@/components/layout';
import { Link, ReadView, Stack, Text } from '@/components/ui';
import { findPath, projectsPath } from '@/client/paths';
import { useTeams } from '@/features/teams';
import { NewProjectForm } from '../components/new-project-form';

/** A team, a project and its kind of motor in one short form. */
export function NewProjectScreen() {
  const router = useRouter();
  const teams = useTeams();
  return (
    <EntryFrame>
      <Stack gap={20}>
        <Text kind="title" heading={1}>
          Make a project
        </Text>
        <ReadView of={teams} what="your teams">
          {(list) => (
            <NewProjectForm
              teams={list.filter(({ isLead }) => isLead)}
              onMade={({ id }) => router.replace(findPath(id) as never)}
            />
          )}
        </ReadView>
        <p>
          <Link href={projectsPath()} className="lone-link">
            My projects
          </Link>
        </p>
      </Stack>
    </EntryFrame>
  );
}
