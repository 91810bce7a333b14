import { useTheme } from '@/components/theme';
import { Banner, Button, Caption, ListRow, Person, Row, Stack } from '@/components/ui';
import { projectsPath } from '@/client/paths';
import { usePerson } from '@/client/session';
import { useSignOut } from '@/features/auth';

/** Oneself on a phone, where there is no rail: theme, other projects, the way out. */
export function OwnCorner() {
  const { theme, toggleTheme } = useTheme();
  const person = usePerson();
  const signOut = useSignOut();
  if (!person) return null;
  return (
    <Stack gap={8}>
      <Caption>You</Caption>
      <ListRow lead={<Person name={person.name} />} title={person.name} detail={person.email} />
      {signOut.error ? <Banner kind="danger">{`Not signed out: ${signOut.error.message}`}</Banner> : null}
      <Row wrap>
        <Button href={projectsPath()}>My projects</Button>
        <Button onPress={toggleTheme}>{theme === 'dark' ? 'Light theme' : 'Dark theme'}</Button>
        <Button onPress={() => signOut.mutate()} busyText={signOut.isPending ? 'Signing out' : undefined}>
          Sign out
        </Button>
      </Row>
    </Stack>
  );
}
