import type { EntityManager } from 'typeorm';
import type { EventKind, EventPayload } from '../../shared/contracts';
import { AuditEntry, Job, ProjectEventRow, StreamHead } from './entities';

export interface AnnouncedEvent {
  projectId: string;
  eventNumber: number;
  kind: EventKind;
  subjectId: string;
  actorId: string;
  payload: unknown;
  at: Date;
}

export interface AuditInput {
  action: string;
  subjectKind: string;
  subjectId: string;
  before?: unknown;
  after?: unknown;
}

export interface JobInput {
  kind: string;
  subjectId: string;
  payload: unknown;
  dedupeKey?: string;
}

interface UnitSetting {
  actorId: string;
  requestId: string;
  projectId: string | null;
}

/** What a use case writes with: rows, audit entries, events and jobs, all or nothing. */
export class Unit {
  readonly events: AnnouncedEvent[] = [];
  readonly at = new Date();
  private head = 0;
  private headAtStart = 0;

  constructor(
    readonly manager: EntityManager,
    private readonly setting: UnitSetting,
  ) {}

  get actorId(): string {
    return this.setting.actorId;
  }

  /** Locks the project's event counter: from here on this unit is alone in the project. */
  async lockStream(): Promise<void> {
    if (!this.setting.projectId) return;
    const row = await this.manager.findOne(StreamHead, {
      where: { projectId: this.setting.projectId },
      lock: { mode: 'pessimistic_write' },
    });
    if (!row) throw new Error('The project has no event counter.');
    this.head = row.eventNumber;
    this.headAtStart = row.eventNumber;
  }

  /** Starts the counter of a project that this unit makes. */
  async openStream(projectId: string): Promise<void> {
    await this.manager.insert(StreamHead, { projectId, eventNumber: 0 });
    this.setting.projectId = projectId;
  }

  /** The payload is the presenter's whole object; it may need the number (a message's order is its number). */
  announce<Kind extends EventKind>(
    kind: Kind,
    subjectId: string,
    payload: EventPayload<Kind> | ((eventNumber: number) => EventPayload<Kind>),
  ): number {
    if (!this.setting.projectId) throw new Error('An event needs a project.');
    this.head += 1;
    this.events.push({
      projectId: this.setting.projectId,
      eventNumber: this.head,
      kind,
      subjectId,
      actorId: this.setting.actorId,
      payload: typeof payload === 'function' ? payload(this.head) : payload,
      at: this.at,
    });
    return this.head;
  }

  /** The number the next event will get. */
  get nextEventNumber(): number {
    return this.head + 1;
  }

  async audit(entry: AuditInput): Promise<void> {
    await this.manager.insert(AuditEntry, {
      projectId: this.setting.projectId,
      actorId: this.setting.actorId,
      requestId: this.setting.requestId,
      at: this.at,
      action: entry.action,
      subjectKind: entry.subjectKind,
      subjectId: entry.subjectId,
      before: (entry.before ?? null) as object | null,
      after: (entry.after ?? null) as object | null,
    });
  }

  async enqueue(job: JobInput): Promise<void> {
    await this.manager.insert(Job, {
      kind: job.kind,
      projectId: this.setting.projectId,
      subjectId: job.subjectId,
      payload: job.payload as object,
      state: 'ready',
      runAt: this.at,
      dedupeKey: job.dedupeKey ?? null,
    });
  }

  /** Writes the announced events and the counter, just before the commit. */
  async seal(): Promise<void> {
    const projectId = this.setting.projectId;
    if (!projectId || this.head === this.headAtStart) return;
    await this.manager.insert(ProjectEventRow, this.events as object[]);
    await this.manager.update(StreamHead, { projectId }, { eventNumber: this.head });
  }
}
