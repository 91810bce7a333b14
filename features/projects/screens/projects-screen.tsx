import Plus from 'lucide-react-native/icons/plus';
import { EntryFrame } from '@/components/layout';
import { Button, Empty, List, ListRow, Mark, ReadView, Stack, Text } from '@/components/ui';
import { findPath, newProjectPath } from '@/client/paths';
import { usePerson } from '@/client/session';
import { OwnPerson } from '../components/own-person';
import { motorWords } from '../motor-words.data';
import { useProjects } from '../use-projects';

/** The projects of whoever is signed in. */
export function ProjectsScreen() {
  const projects = useProjects();
  const person = usePerson();
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
        <OwnPerson />
      </Stack>
    </EntryFrame>
  );
}
