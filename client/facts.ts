import { eventKinds, type EventKind, type EventPayload, type KnownEvent } from '@/shared/contracts/live';
import type { ProjectEvent } from '@/shared/contracts/projects';

/** What happened, whole, as an event announces it or as the reply to one's own act tells it. */
export type Fact = { [Kind in EventKind]: { kind: Kind; payload: EventPayload<Kind> } }[EventKind];

/** Says that a cached value can't be patched by a fact and has to be read again. */
export const outOfDate = Symbol('out of date');
export type Applied<Value> = Value | typeof outOfDate;

/**
 * Takes a fact into a cached value. Pure and idempotent: the same value (by reference) when the fact says nothing
 * about it or nothing new.
 */
export type Apply<Value> = (value: Value, fact: Fact, projectId: string) => Applied<Value>;

/** The fact an event carries; null when this page doesn't know the kind or can't read it. */
export function factOf(event: Pick<ProjectEvent, 'kind' | 'payload'>): Fact | null {
  if (!Object.hasOwn(eventKinds, event.kind)) return null;
  const parsed = eventKinds[event.kind as EventKind].safeParse(event.payload);
  return parsed.success ? ({ kind: event.kind, payload: parsed.data } as Fact) : null;
}

/** Applies the facts of events in order; `outOfDate` as soon as one can't be patched in. */
export function applyEvents<Value>(
  value: Value,
  events: readonly (ProjectEvent | KnownEvent)[],
  apply: Apply<Value>,
): Applied<Value> {
  let now: Value = value;
  for (const event of events) {
    const fact = factOf(event);
    const next = fact ? apply(now, fact, event.projectId) : outOfDate;
    if (next === outOfDate) return outOfDate;
    now = next;
  }
  return now;
}
