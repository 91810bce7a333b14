import type { SessionReply } from '@/shared/contracts/auth';
import type { Access } from './access';
import { ApiProblem, signInNeeded } from './problem';

interface RenewalTools {
  access: Access;
  ask: () => Promise<SessionReply>;
  /** Missing on plain http: then the server's grace for two tabs that renew at once has to do. */
  locks?: LockManager;
}

export interface Renewal {
  /** A token other than `refused`, renewed at most once however many calls ask. */
  renewAfter: (refused: string | null) => Promise<string>;
}

/** Renews the access token: one flight in a tab, one tab at a time where the browser has locks. */
export function renewal({ access, ask, locks }: RenewalTools): Renewal {
  let flight: { era: number; token: Promise<string> } | null = null;

  async function renew(era: number): Promise<string> {
    const wasSignedIn = access.person !== null;
    try {
      const reply = await (locks ? locks.request('locant-renew', ask) : ask());
      // Signed in or out meanwhile: that came later and counts.
      if (access.era === era) access.accept(reply);
    } catch (error) {
      if (error instanceof ApiProblem && error.status === 401 && access.era === era) access.end(wasSignedIn);
      throw error;
    } finally {
      if (flight?.era === era) flight = null;
    }
    if (access.token === null) throw signInNeeded();
    return access.token;
  }

  return {
    async renewAfter(refused) {
      if (access.token !== null && access.token !== refused) return access.token;
      if (access.read().status === 'signed out') throw signInNeeded();
      if (flight?.era !== access.era) flight = { era: access.era, token: renew(access.era) };
      return flight.token;
    },
  };
}
