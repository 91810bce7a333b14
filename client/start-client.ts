import type { QueryClient } from '@tanstack/react-query';
import { access, type Access } from './access';
import { liveProjects, type LiveProjects } from './live-projects';
import { outbox, type Outbox } from './outbox';
import { forgetEverything, queryClient } from './query-client';
import { realtime, type Realtime } from './realtime';
import { session } from './session';

/** What belongs to one page of one person. */
export interface ClientParts {
  access: Access;
  realtime: Realtime;
  liveProjects: LiveProjects;
  outbox: Outbox;
  queryClient: QueryClient;
}

/** Joins them: the socket, the outbox and what is held follow who is signed in, and facts settle what was sent. */
export function joinParts({ access, realtime, liveProjects, outbox, queryClient }: ClientParts): void {
  let lastPersonId: string | null = null;
  const forget = () => {
    realtime.stop();
    liveProjects.reset();
    forgetEverything(queryClient);
  };
  access.subscribe(() => {
    const now = access.read();
    if (now.status === 'signed in') {
      if (lastPersonId !== null && lastPersonId !== now.person.id) forget();
      lastPersonId = now.person.id;
      realtime.start();
      void outbox.open(now.person.id);
    }
    if (now.status === 'signed out') {
      realtime.stop();
      outbox.close();
      // Run out while at work: the same person mostly comes back to the same page.
      if (!now.expired) forget();
    }
  });
  realtime.onConnection.subscribe(() => {
    if (realtime.connection() === 'connected') outbox.wake();
  });
  liveProjects.onFact.subscribe((projectId, fact) => {
    if (fact.kind !== 'message.posted') return;
    const { message, thread } = fact.payload;
    realtime.people.wrote(projectId, thread.subjectKey, message.by.id);
    void outbox.acknowledge(message.clientKey);
  });
}

let started = false;

/** Once, when the page opens. */
export function startClient(): void {
  if (started) return;
  started = true;
  joinParts({ access, realtime, liveProjects, outbox, queryClient });
  if (typeof window !== 'undefined' && typeof window.addEventListener === 'function') {
    window.addEventListener('online', () => {
      session.retryNow();
      realtime.retryNow();
      outbox.wake();
    });
  }
  void session.restore();
}
