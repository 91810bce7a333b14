import type { ReactNode } from 'react';
import { useTheme } from '@/components/theme';
import { Banner, Button, ListRow, Person, Row } from '@/components/ui';
import { usePerson } from '@/client/session';
import { useSignOut } from '@/features/auth';

/** Oneself, with the theme and the way out; more ways stand before them. */
export function OwnPerson({ children }: { children?: ReactNode }) {
  const { theme, toggleTheme } = useTheme();
  const person = usePerson();
  const signOut = useSignOut();
  return (
    <>
      {person ? (
        <ListRow lead={<Person name={person.name} />} title={person.name} detail={person.email} />
      ) : null}
      {signOut.error ? <Banner kind="danger">{`Not signed out: ${signOut.error.message}`}</Banner> : null}
      <Row wrap>
        {children}
        <Button onPress={toggleTheme}>{theme === 'dark' ? 'Light theme' : 'Dark theme'}</Button>
        <Button onPress={() => signOut.mutate()} busyText={signOut.isPending ? 'Signing out' : undefined}>
          Sign out
        </Button>
      </Row>
    </>
  );
}
