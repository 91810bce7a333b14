// One person's browser: the product's own client parts, on a line that may fail, with what a device keeps between pages.
import { QueryObserver, type QueryClient } from '@tanstack/react-query';
import { Access } from '@/client/access';
import { createApi, type Api } from '@/client/api';
import { LiveProjects } from '@/client/live-projects';
import { liveQuery } from '@/client/live-query';
import { Outbox, sendOver } from '@/client/outbox';
import { ProjectStream } from '@/client/project-stream';
import { makeQueryClient } from '@/client/query-client';
import { laneOf } from '@/client/queued-message';
import { Realtime } from '@/client/realtime';
import { createSession } from '@/client/session';
import { joinParts } from '@/client/start-client';
import { memoryStorage } from '@/client/storage';
import { applyToThreadOfSubject, mergeThread, prependEarlier } from '@/features/threads/apply-thread-event';
import type { SubjectThread } from '@/features/threads/apply-thread-event';
import { projects, subjectKey, threads, type ProjectEvent, type Subject } from '@/shared/contracts';

/** What stays when a page is loaded again: the cookie, the store, and what the test writes down. */
export class Device {
  readonly storage = memoryStorage();
  cookie = '';
  /** Every event taken in, in the order in which it was. */
  readonly seen: ProjectEvent[] = [];
  /** Events as the socket brought them, whatever the order. */
  readonly heard: ProjectEvent[] = [];

  constructor(
    readonly origin: string,
    readonly projectId: string,
    readonly subjects: readonly Subject[],
    readonly firstEvent: number,
  ) {}
}

const threadQuery = (call: Api['call'], projectId: string, of: Subject) =>
  liveQuery<SubjectThread>({
    projectId,
    queryKey: ['project', projectId, 'threads', 'of', subjectKey(of)],
    read: (signal) =>
      call(threads.ofSubject, { params: { projectId, subjectKey: subjectKey(of) }, query: {}, signal }),
    apply: (view, fact) => applyToThreadOfSubject(view, fact, subjectKey(of)),
    merge: mergeThread,
  });

/** A query that ends after its page would wait half an hour to be forgotten, and hold up the end of the tests. */
function withoutTimers(client: QueryClient): QueryClient {
  const { queries, ...rest } = client.getDefaultOptions();
  client.setDefaultOptions({ ...rest, queries: { ...queries, gcTime: Infinity } });
  return client;
}

export class ClientPage {
  readonly access = new Access();
  readonly api: Api;
  readonly realtime: Realtime;
  readonly outbox: Outbox;
  readonly queryClient = withoutTimers(makeQueryClient());
  readonly liveProjects: LiveProjects;
  private readonly stream: ProjectStream;
  private readonly gone = new AbortController();
  private readonly ends: (() => void)[] = [];

  constructor(private readonly device: Device) {
    const { origin, projectId, seen, heard, firstEvent } = device;
    this.api = createApi({ access: this.access, fetch: (address, init) => this.fetch(address, init) });
    this.realtime = new Realtime(this.access, this.api.renewal, origin);
    this.liveProjects = new LiveProjects(this.queryClient, this.api.call, this.realtime);
    this.outbox = new Outbox({
      storage: device.storage,
      send: sendOver(this.api.call, this.liveProjects),
      giveBack: () => Promise.reject(new Error('Nothing here is a day old.')),
    });
    joinParts(this);
    this.stream = new ProjectStream({
      startAt: seen.at(-1)?.eventNumber ?? firstEvent,
      readEvents: (after) => this.api.call(projects.events, { params: { projectId }, query: { after } }),
      apply: (events) => seen.push(...events),
      readAfresh: () => {
        throw new Error('The project is not so long that it has to be read afresh.');
      },
    });
    this.realtime.onEvent.subscribe((event) => {
      heard.push(event);
      this.stream.push(event);
    });
    this.realtime.onHead.subscribe((_, head) => this.stream.head(head));
    this.realtime.onJoined.subscribe((_, head) => this.stream.joined(head));
  }

  /** Takes up the session that the cookie holds; false when it is lost. */
  async restore(): Promise<boolean> {
    await createSession(this.access, this.api).restore();
    return this.access.person !== null;
  }

  /** Reads the project and its threads, and follows it. */
  async open(): Promise<void> {
    const { projectId, subjects } = this.device;
    const project = await this.queryClient.fetchQuery({
      queryKey: ['project', projectId],
      queryFn: () => this.api.call(projects.read, { params: { projectId } }),
      retry: true,
      retryDelay: 200,
    });
    this.liveProjects.anchor(projectId, project.head);
    for (const subject of subjects) {
      const options = threadQuery(this.api.call, projectId, subject);
      this.ends.push(new QueryObserver(this.queryClient, options).subscribe(() => {}));
    }
    this.ends.push(this.liveProjects.open(projectId));
  }

  /** The page is closed or loaded anew: whatever is under way ends here. */
  close(): void {
    this.gone.abort();
    for (const end of this.ends) end();
    this.stream.stop();
    this.outbox.close();
    this.realtime.stop();
    this.liveProjects.reset();
    this.queryClient.clear();
  }

  get lastEvent(): number {
    return this.stream.lastApplied;
  }

  view(subject: Subject): SubjectThread | undefined {
    const { queryKey } = threadQuery(this.api.call, this.device.projectId, subject);
    return this.queryClient.getQueryData<SubjectThread>(queryKey);
  }

  waiting(subject: Subject): number {
    return this.outbox.messagesOf(laneOf({ projectId: this.device.projectId, subject })).length;
  }

  /** What somebody does who scrolls up to the beginning. */
  async readToTheBeginning(subject: Subject): Promise<SubjectThread> {
    const { projectId } = this.device;
    for (;;) {
      const view = this.view(subject);
      if (!view) throw new Error('The thread was never read.');
      if (view.earlier === null) return view;
      const params = { projectId, subjectKey: subjectKey(subject) };
      const page = await this.api.call(threads.ofSubject, { params, query: { before: view.earlier } });
      const { queryKey } = threadQuery(this.api.call, projectId, subject);
      this.queryClient.setQueryData<SubjectThread>(queryKey, (held) => held && prependEarlier(held, page));
    }
  }

  /** A browser's fetch: knows its origin, keeps the cookie, stops with the page. */
  private async fetch(address: string, init: RequestInit): Promise<Response> {
    const signals = [this.gone.signal, ...(init.signal ? [init.signal] : [])];
    const response = await fetch(this.device.origin + address, {
      ...init,
      headers: { ...(init.headers as Record<string, string>), cookie: this.device.cookie },
      signal: AbortSignal.any(signals),
    });
    const [set] = response.headers.getSetCookie();
    if (set) this.device.cookie = set.split(';')[0] ?? '';
    return response;
  }
}
