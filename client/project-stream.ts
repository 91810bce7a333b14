import type { z } from 'zod';
import type { eventsReply, ProjectEvent } from '@/shared/contracts/projects';
import { backoffMilliseconds, Pause } from './wait';

export interface StreamTools {
  /** The events up to this number are in what was read. */
  startAt: number;
  /** `projects.events`. */
  readEvents: (after: number) => Promise<z.infer<typeof eventsReply>>;
  /** Events in order, each once, without a gap. */
  apply: (events: readonly ProjectEvent[]) => void;
  /** Forget what is held and read everything again. */
  readAfresh: () => void;
  pause?: (attempt: number) => Promise<void>;
}

/** Far more than the server sends out of order; what is dropped is asked for. */
const mostHeld = 2000;

/**
 * Puts a project's events in order. They may come doubled, late, out of order or not at all; a gap, a reconnect or a
 * head that is further makes it ask for what is missing.
 */
export class ProjectStream {
  private last: number;
  private readonly held = new Map<number, ProjectEvent>();
  private catching: Promise<void> | null = null;
  private wanted = false;
  private stopped = false;
  private readonly waiting = new Pause();

  constructor(private readonly tools: StreamTools) {
    this.last = tools.startAt;
  }

  /** The number of the last event applied. */
  get lastApplied(): number {
    return this.last;
  }

  push(event: ProjectEvent): void {
    if (this.stopped || event.eventNumber <= this.last) return;
    if (this.held.size < mostHeld) this.held.set(event.eventNumber, event);
    this.release();
    if (this.held.size > 0) void this.catchUp();
  }

  /** A regular word on how far the project is; it may be older than the last event. */
  head(number: number): void {
    if (number > this.last) void this.catchUp();
  }

  /** The line is (back) up: whatever was missed is asked for. A lower head means an older copy was restored. */
  joined(head: number): void {
    this.waiting.wake();
    if (head !== this.last) void this.catchUp();
  }

  stop(): void {
    this.stopped = true;
    this.waiting.wake();
  }

  /** Asks for what is missing; calls while it asks are one more round. */
  catchUp(): Promise<void> {
    this.wanted = true;
    this.catching ??= this.rounds().finally(() => {
      this.catching = null;
    });
    return this.catching;
  }

  private async rounds(): Promise<void> {
    let failures = 0;
    while (!this.stopped && this.wanted) {
      this.wanted = false;
      const after = this.last;
      try {
        const reply = await this.tools.readEvents(after);
        if (this.stopped) return;
        failures = 0;
        if (reply.readAfresh || reply.head < after) this.startAgain(reply.head, reply.head >= after);
        else this.take(reply.events);
        if (this.last < reply.head && this.last > after) this.wanted = true;
      } catch {
        if (this.stopped) return;
        this.wanted = true;
        await this.rest(failures);
        failures += 1;
      }
    }
  }

  private take(events: readonly ProjectEvent[]): void {
    for (const event of events) if (event.eventNumber > this.last) this.held.set(event.eventNumber, event);
    this.release();
  }

  /** Applies what follows on the last number without a gap. */
  private release(): void {
    const ready: ProjectEvent[] = [];
    for (let next = this.held.get(this.last + 1); next; next = this.held.get(this.last + 1)) {
      this.held.delete(next.eventNumber);
      this.last = next.eventNumber;
      ready.push(next);
    }
    if (ready.length > 0) this.tools.apply(ready);
  }

  private startAgain(head: number, forward: boolean): void {
    this.last = forward ? Math.max(this.last, head) : head;
    for (const number of [...this.held.keys()]) if (number <= this.last) this.held.delete(number);
    this.tools.readAfresh();
    this.release();
  }

  private async rest(failures: number): Promise<void> {
    if (this.tools.pause) return this.tools.pause(failures);
    await this.waiting.wait(
      backoffMilliseconds(failures, { firstMilliseconds: 500, mostMilliseconds: 8000 }),
    );
  }
}
