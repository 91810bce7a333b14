import { Redirect, useLocalSearchParams } from 'expo-router';
import { createElement } from 'react';
import { projectsPath } from '@/client/paths';
import { useSession } from '@/client/session';

/** Only addresses of our own pages are followed back. */
export function safeWayBack(back: unknown): string {
  return typeof back === 'string' && /^\/(?![/\\])/.test(back) ? back : projectsPath();
}

/** Where to go once signed in, and the step there for whoever already is. */
export function useWayBack() {
  const { back } = useLocalSearchParams<{ back?: string }>();
  const session = useSession();
  const leave =
    session.status === 'signed in' ? createElement(Redirect, { href: safeWayBack(back) as never }) : null;
  return { back: typeof back === 'string' ? back : undefined, leave };
}
