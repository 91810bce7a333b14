import { Redirect, Slot, usePathname } from 'expo-router';
import { EntryFrame } from '@/components/layout';
import { Banner, Loading } from '@/components/ui';
import { signInPath } from '@/client/paths';
import { useSession } from '@/client/session';

/** Everything behind it needs somebody signed in; others sign in first and come back to the same address. */
export function SignedInOnly() {
  const session = useSession();
  const path = usePathname();
  // What stands behind the question mark belongs to the address too.
  const back = path === '/' ? undefined : path + (globalThis.location?.search ?? '');
  if (session.status === 'signed in') return <Slot />;
  if (session.status === 'signed out') return <Redirect href={signInPath(back) as never} />;
  return (
    <EntryFrame>
      {session.status === 'unreachable' ? (
        <Banner kind="warn" announce>
          The server does not answer. Trying again by itself; what you wrote is kept here.
        </Banner>
      ) : (
        <Loading>Opening your session</Loading>
      )}
    </EntryFrame>
  );
}
