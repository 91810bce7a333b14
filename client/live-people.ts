import type { z } from 'zod';
import type { PersonBrief } from '@/shared/contracts/common';
import type { typing } from '@/shared/contracts/live';
import { Emitter } from './emitter';

/** Who is in a project. While the line is down it stays as it was, with the time it was true. */
export interface Presence {
  people: PersonBrief[];
  /** False while the line is down. */
  live: boolean;
  /** When it was last known, in milliseconds by this device's clock. */
  asOf: number;
}

const nobody: Presence = { people: [], live: false, asOf: 0 };
const noTypists: PersonBrief[] = [];
const typingLastsMilliseconds = 4000;

/** Presence and typing, as the socket tells them. Nothing of it is stored. */
export class LivePeople {
  private readonly presence = new Map<string, Presence>();
  private readonly typists = new Map<string, PersonBrief[]>();
  private readonly timers = new Map<string, ReturnType<typeof setTimeout>>();
  private readonly changes = new Emitter<[]>();
  readonly subscribe = this.changes.subscribe;

  presenceOf(projectId: string): Presence {
    return this.presence.get(projectId) ?? nobody;
  }

  typistsOf(projectId: string, subjectKey: string): PersonBrief[] {
    return this.typists.get(`${projectId}/${subjectKey}`) ?? noTypists;
  }

  here(projectId: string, people: PersonBrief[]): void {
    this.presence.set(projectId, { people, live: true, asOf: Date.now() });
    this.changes.emit();
  }

  types({ projectId, subjectKey, person }: z.infer<typeof typing>): void {
    const place = `${projectId}/${subjectKey}`;
    const key = `${place}/${person.id}`;
    clearTimeout(this.timers.get(key));
    this.timers.set(
      key,
      setTimeout(() => this.stopsTyping(place, person.id), typingLastsMilliseconds),
    );
    const now = this.typists.get(place) ?? noTypists;
    if (now.some((one) => one.id === person.id)) return;
    this.typists.set(place, [...now, person]);
    this.changes.emit();
  }

  /** Somebody's message arrived: they no longer type it. */
  wrote(projectId: string, subjectKey: string, personId: string): void {
    this.stopsTyping(`${projectId}/${subjectKey}`, personId);
  }

  /** The line is down: what is known grows old. */
  freeze(): void {
    for (const [projectId, known] of this.presence) this.presence.set(projectId, { ...known, live: false });
    this.typists.clear();
    this.changes.emit();
  }

  forget(projectId: string): void {
    if (this.presence.delete(projectId)) this.changes.emit();
  }

  clear(): void {
    for (const timer of this.timers.values()) clearTimeout(timer);
    this.timers.clear();
    this.presence.clear();
    this.typists.clear();
    this.changes.emit();
  }

  private stopsTyping(place: string, personId: string): void {
    const key = `${place}/${personId}`;
    clearTimeout(this.timers.get(key));
    this.timers.delete(key);
    const now = this.typists.get(place);
    if (!now?.some((one) => one.id === personId)) return;
    this.typists.set(
      place,
      now.filter((one) => one.id !== personId),
    );
    this.changes.emit();
  }
}
