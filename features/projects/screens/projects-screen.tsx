import Plus from 'lucide-react-native/icons/plus';
import { EntryFrame } from '@/components/layout';
import { useTheme } from '@/components/theme';
import {
  Banner,
  Button,
  Empty,
  List,
  ListRow,
  Mark,
  Person,
  ReadView,
  Row,
  Stack,
  Text,
} from '@/components/ui';
import { findPath, newProjectPath } from '@/client/paths';
import { usePerson } from '@/client/session';
import { useSignOut } from '@/features/auth';
import { motorWords } from '../motor-words.data';
import { useProjects } from '../use-projects';

/** The projects of whoever is signed in. */
export function ProjectsScreen() {
  const projects = useProjects();
  const person = usePerson();
  const signOut = useSignOut();
  const { theme, toggleTheme } = useTheme();
  return (
    <EntryFrame>
      <Stack gap={20}>
        <Text kind="title" heading={1}>
          My projects
        </Text>
        <ReadView of={projects} what="your projects">
          {(list) =>
            list.length > 0 ? (
              <List label="My projects" rows={list} keyOf={({ id }) => id}>
                {({ id, name, teamName, motorKind, role, invented }) => (
                  <ListRow
                    href={findPath(id)}
                    title={name}
                    detail={[teamName, motorWords[motorKind].title, invented ? 'invented data' : '']
                      .filter(Boolean)
                      .join(', ')}
                    end={<Mark>{role}</Mark>}
                  />
                )}
              </List>
            ) : (
              <Empty title="No project yet">
                {`Make one, or ask a lead to add you to theirs under ${person?.email ?? 'your address'}.`}
              </Empty>
            )
          }
        </ReadView>
        <Button kind="primary" icon={Plus} href={newProjectPath()} full>
          Make a project
        </Button>
        {person ? (
          <ListRow lead={<Person name={person.name} />} title={person.name} detail={person.email} />
        ) : null}
        {signOut.error ? <Banner kind="danger">{`Not signed out: ${signOut.error.message}`}</Banner> : null}
        <Row wrap>
          <Button onPress={toggleTheme}>{theme === 'dark' ? 'Light theme' : 'Dark theme'}</Button>
          <Button onPress={() => signOut.mutate()} busyText={signOut.isPending ? 'Signing out' : undefined}>
            Sign out
          </Button>
        </Row>
      </Stack>
    </EntryFrame>
  );
}
