import { useSyncExternalStore } from 'react';
import type { z } from 'zod';
import { auth, type SessionReply, type signInBody, type signUpBody } from '@/shared/contracts/auth';
import { access, type Access, type Session } from './access';
import { api, type Api } from './api';
import { ApiProblem } from './problem';
import { backoffMilliseconds, Pause } from './wait';

export interface SessionActs {
  /** Takes up the session that the browser's cookie still holds; keeps asking while the server is away. */
  restore: () => Promise<void>;
  /** Ends the wait of `restore`: the line is back. */
  retryNow: () => void;
  signUp: (body: z.input<typeof signUpBody>) => Promise<void>;
  signIn: (body: z.input<typeof signInBody>) => Promise<void>;
  /** Throws when the server can't be reached: the cookie would then sign in again by itself. */
  signOut: () => Promise<void>;
}

// Several tries within the time for which the server takes a token whose successor got lost on the way.
const waits = { firstMilliseconds: 500, mostMilliseconds: 3000 };

export function createSession(access: Access, { call, renewal }: Pick<Api, 'call' | 'renewal'>): SessionActs {
  const pause = new Pause();

  async function enter(ask: () => Promise<SessionReply>): Promise<void> {
    const reply = await ask();
    access.begin();
    access.accept(reply);
  }

  return {
    async restore() {
      for (let attempt = 0; ['restoring', 'unreachable'].includes(access.read().status); attempt += 1) {
        try {
          await renewal.renewAfter(null);
          return;
        } catch (error) {
          if (!(error instanceof ApiProblem) || !error.undecided) {
            if (access.person === null) access.end(false);
            return;
          }
          access.unreachable();
          await pause.wait(backoffMilliseconds(attempt, waits));
        }
      }
    },
    retryNow: () => pause.wake(),
    signUp: (body) => enter(() => call(auth.signUp, { body })),
    signIn: (body) => enter(() => call(auth.signIn, { body })),
    async signOut() {
      await call(auth.signOut, {});
      access.begin();
      access.end(false);
    },
  };
}

export const session = createSession(access, api);
export const { signIn, signUp, signOut } = session;

/** Who is signed in. Changes when a person comes or goes, not when a token is renewed. */
export function useSession(): Session {
  return useSyncExternalStore(access.subscribe, access.read, access.read);
}

/** The person signed in; null outside a session. */
export function usePerson() {
  const now = useSession();
  return now.status === 'signed in' ? now.person : null;
}
