// State read before + the events an act announced, applied as the client applies them = state read afterwards.
import { applyEvents, outOfDate, type Apply } from '@/client/facts';
import { projects, type ProjectEvent } from '@/shared/contracts';
import type { TestPerson } from './person';

/** Something a screen holds: how it is read, and how the client takes events into it. */
export interface HeldView<Value = unknown> {
  name: string;
  read: () => Promise<Value>;
  apply: Apply<Value>;
}

/** The same with its type forgotten, so that views of many kinds stand in one list. */
export function heldView<Value>({ name, read, apply }: HeldView<Value>): HeldView {
  return { name, read, apply: (value, fact, projectId) => apply(value as Value, fact, projectId) };
}

export interface Announcement<Result> {
  result: Result;
  events: ProjectEvent[];
  /** Views that took the events in by themselves and changed. */
  patched: string[];
  /** Views that the client reads again, because it cannot work the events in. */
  readAgain: string[];
}

async function eventsAfter(person: TestPerson, projectId: string, after: number): Promise<ProjectEvent[]> {
  const reply = await person.must(projects.events, { params: { projectId }, query: { after } });
  if (reply.readAfresh) throw new Error('Too much happened to be announced.');
  return reply.events;
}

/** Acts, and demands of every view that it ends as it is read: none may silently differ. */
export async function verifyAnnouncement<Result>(
  person: TestPerson,
  projectId: string,
  act: () => Promise<Result>,
  views: readonly HeldView[],
): Promise<Announcement<Result>> {
  const { head } = await person.must(projects.read, { params: { projectId } });
  const before = await Promise.all(views.map((view) => view.read()));
  const result = await act();
  const events = await eventsAfter(person, projectId, head);
  const after = await Promise.all(views.map((view) => view.read()));
  const patched: string[] = [];
  const readAgain: string[] = [];
  views.forEach((view, at) => {
    const applied = applyEvents(before[at], events, view.apply);
    if (applied === outOfDate) {
      readAgain.push(view.name);
      return;
    }
    if (applied !== before[at]) patched.push(view.name);
    expect({ view: view.name, value: applied }).toEqual({ view: view.name, value: after[at] });
    // Doubled events change nothing.
    expect(applyEvents(applied, events, view.apply)).toEqual(applied);
  });
  return { result, events, patched: patched.sort(), readAgain: readAgain.sort() };
}
