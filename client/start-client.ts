import { access } from './access';
import { liveProjects } from './live-projects';
import { outbox } from './outbox';
import { forgetEverything, queryClient } from './query-client';
import { realtime } from './realtime';
import { session } from './session';

let lastPersonId: string | null = null;
let started = false;

/** Follows who is signed in: the socket, the outbox and what is held belong to one person. */
function follow(): void {
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
}

function forget(): void {
  realtime.stop();
  liveProjects.reset();
  forgetEverything(queryClient);
}

/** Once, when the page opens. */
export function startClient(): void {
  if (started) return;
  started = true;
  access.subscribe(follow);
  realtime.onConnection.subscribe(() => {
    if (realtime.connection() === 'connected') outbox.wake();
  });
  liveProjects.onFact.subscribe((projectId, fact) => {
    if (fact.kind !== 'message.posted') return;
    const { message, thread } = fact.payload;
    realtime.people.wrote(projectId, thread.subjectKey, message.by.id);
    void outbox.acknowledge(message.clientKey);
  });
  if (typeof window !== 'undefined' && typeof window.addEventListener === 'function') {
    window.addEventListener('online', () => {
      session.retryNow();
      realtime.retryNow();
      outbox.wake();
    });
  }
  void session.restore();
}
