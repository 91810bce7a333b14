import { useEffect, useMemo, useSyncExternalStore } from 'react';
import { DraftSession, type DraftView } from './draft-session';
import { drafts } from './drafts';
import { usePerson } from './session';

export interface DraftHandle extends DraftView {
  type: (text: string) => void;
  /** After it was taken, by the outbox or the server. */
  clear: () => Promise<unknown>;
  /** Puts what another tab typed behind what stands here. */
  takeElsewhere: () => void;
}

/** The draft of a place, such as `thread:<project>:<subject>`, of the person signed in. */
export function useDraft(place: string): DraftHandle {
  const account = usePerson()?.id ?? 'nobody';
  const open = useMemo(() => new DraftSession(drafts, account, place), [account, place]);
  const view = useSyncExternalStore(open.subscribe, open.read, open.read);
  useEffect(() => {
    void open.open();
    const flush = () => void open.flush();
    if (typeof window !== 'undefined') window.addEventListener?.('pagehide', flush);
    return () => {
      flush();
      if (typeof window !== 'undefined') window.removeEventListener?.('pagehide', flush);
    };
  }, [open]);
  return useMemo(
    () => ({
      ...view,
      type: (text: string) => open.type(text),
      clear: () => open.clear(),
      takeElsewhere: () => open.takeElsewhere(),
    }),
    [view, open],
  );
}
