import type { QueryClient } from '@tanstack/react-query';
import { projects, type ProjectEvent } from '@/shared/contracts/projects';
import { api, type Api } from './api';
import { Emitter } from './emitter';
import { factOf, outOfDate, type Fact } from './facts';
import { liveCacheOf } from './live-cache';
import { ApiProblem } from './problem';
import { ProjectStream } from './project-stream';
import { queryClient } from './query-client';
import { realtime, type Realtime } from './realtime';

/** Keeps what is held of each open project equal to the server's, event by event. */
export class LiveProjects {
  private readonly streams = new Map<string, ProjectStream>();
  /** Facts from any source: an event, a catch-up, the reply to one's own act. */
  readonly onFact = new Emitter<[projectId: string, fact: Fact]>();

  constructor(
    private readonly client: QueryClient,
    private readonly call: Api['call'],
    private readonly line: Realtime,
  ) {
    line.onEvent.subscribe((event) => this.streams.get(event.projectId)?.push(event));
    line.onHead.subscribe((projectId, head) => this.streams.get(projectId)?.head(head));
    line.onJoined.subscribe((projectId, head) => {
      this.anchor(projectId, head);
      this.streams.get(projectId)?.joined(head);
      this.mendFailures();
    });
    line.onLeft.subscribe((projectId) => this.leave(projectId));
  }

  /** What is read from now on holds every event up to `head`; what was read before is not known to. */
  anchor(projectId: string, head: number): void {
    if (this.streams.has(projectId)) return;
    const cache = liveCacheOf(this.client);
    this.streams.set(
      projectId,
      new ProjectStream({
        startAt: head,
        readEvents: (after) => this.readEvents(projectId, after),
        apply: (events) => this.apply(projectId, events),
        readAfresh: () => cache.readAfresh(projectId),
      }),
    );
    cache.countFromHere(projectId);
  }

  /** Follows the project live until the returned function is called. */
  open(projectId: string): () => void {
    return this.line.join(projectId);
  }

  /** Takes in what the reply to one's own act tells, as its event will. */
  tell(projectId: string, facts: readonly Fact[]): void {
    liveCacheOf(this.client).tell(projectId, facts);
    for (const fact of facts) this.onFact.emit(projectId, fact);
  }

  /** Somebody else signs in. */
  reset(): void {
    for (const stream of this.streams.values()) stream.stop();
    this.streams.clear();
  }

  private apply(projectId: string, events: readonly ProjectEvent[]): void {
    const facts = events.map((event) => factOf(event));
    liveCacheOf(this.client).tell(
      projectId,
      facts.map((fact) => fact ?? outOfDate),
    );
    for (const fact of facts) if (fact) this.onFact.emit(projectId, fact);
  }

  private async readEvents(projectId: string, after: number) {
    try {
      return await this.call(projects.events, { params: { projectId }, query: { after } });
    } catch (error) {
      if (error instanceof ApiProblem && error.status === 401) this.stopStream(projectId);
      else if (error instanceof ApiProblem && !error.undecided) this.leave(projectId);
      throw error;
    }
  }

  /** The next join begins anew. */
  private stopStream(projectId: string): void {
    this.streams.get(projectId)?.stop();
    this.streams.delete(projectId);
  }

  /** No longer a member: what is held may not be shown. */
  private leave(projectId: string): void {
    this.stopStream(projectId);
    void this.client.resetQueries({ queryKey: ['project', projectId] });
    void this.client.invalidateQueries({ queryKey: ['projects'] });
  }

  /** What failed while the line was down is asked again. */
  private mendFailures(): void {
    void this.client.refetchQueries(
      {
        type: 'active',
        predicate: ({ state }) => state.error instanceof ApiProblem && state.error.undecided,
      },
      { cancelRefetch: false },
    );
  }
}

export const liveProjects = new LiveProjects(queryClient, api.call, realtime);
