// Two people write to each other while lines are cut, replies are lost, pages are loaded anew and the server is killed.
import { ClientPage, Device } from './support/client-page';
import { FaultyLine } from './support/faulty-line';
import { between, seeded } from '@/tests/support/random';
import { isFull, pause, report, until } from '@/tests/support/size';
import {
  eventsAfter,
  openWorkbench,
  shareProject,
  type SharedProject,
  type Workbench,
} from './support/workbench';
import { auth, type Subject } from '@/shared/contracts';
import type { TestPerson } from '@/tests/support/person';

const seed = 20260401;
const size = isFull ? { messages: 500, kills: 20 } : { messages: 120, kills: 3 };
const converge = 15_000;

interface StoredRow {
  event_number: number;
  author_id: string;
  client_key: string;
  text: string;
  subject_key: string;
}

/** One person with the page that is open now; it may be loaded anew at any time. */
class Writer {
  page: ClientPage;
  reloads = 0;
  signedOut = 0;
  readonly written: { text: string; subject: Subject; clientKey: string }[] = [];

  constructor(
    readonly person: TestPerson,
    readonly device: Device,
    readonly line: FaultyLine,
  ) {
    this.page = new ClientPage(device);
  }

  /** Signs in as somebody does at the form: again and again until it is done. */
  async signIn(): Promise<void> {
    const body = { email: this.person.email, password: 'a long enough password' };
    for (;;) {
      const reply = await this.page.api.call(auth.signIn, { body }).catch(() => null);
      if (reply) {
        this.page.access.begin();
        this.page.access.accept(reply);
        return this.page.open();
      }
      await pause(200);
    }
  }

  async reload(): Promise<void> {
    this.reloads += 1;
    this.page.close();
    this.page = new ClientPage(this.device);
    const isBack = await this.page.restore();
    if (isBack) return this.page.open();
    // What is unsent waits on the device for the same person.
    this.signedOut += 1;
    return this.signIn();
  }

  async write(text: string, subject: Subject): Promise<void> {
    await until('the page has its session again', () => this.page.access.person !== null, 60_000);
    const { clientKey } = await this.page.outbox.add({ projectId: this.device.projectId, subject, text });
    this.written.push({ text, subject, clientKey });
  }
}

let bench: Workbench;
let project: SharedProject;
let writers: Writer[] = [];
const random = seeded(seed);

beforeAll(async () => {
  bench = await openWorkbench();
  project = await shareProject(bench.server);
  const [first] = await bench.rows<{ event_number: number }>('SELECT event_number FROM stream_head');
  for (const person of [project.lead, project.contributor]) {
    const line = await FaultyLine.to(bench.server.port, random);
    const subjects = [project.subjectAt(60), project.subjectAt(61)];
    const device = new Device(line.origin, project.projectId, subjects, first?.event_number ?? 0);
    writers.push(new Writer(person, device, line));
  }
  await Promise.all(writers.map((writer) => writer.signIn()));
});
afterAll(async () => {
  for (const { page, line } of writers) {
    page.close();
    await line.close();
  }
  writers = [];
  await bench.close();
});

test(`${size.messages} messages, ${size.kills} server kills: one list on both clients and in the database`, async () => {
  report(`seed ${seed}`);
  const [main, side] = [project.subjectAt(60), project.subjectAt(61)];
  let writing = size.messages;
  let killing = true;

  const write = async (writer: Writer, name: string) => {
    for (let number = 1; writing > 0; number += 1) {
      writing -= 1;
      await writer.write(`${name} ${number}`, random() < 0.8 ? main : side);
      await pause(between(random, 20, isFull ? 300 : 200));
    }
  };
  const disturb = async (writer: Writer) => {
    while (killing || writing > 0) {
      await pause(between(random, 300, 1500));
      if (random() < 0.3) await writer.reload();
      else writer.line.cut(between(random, 0, 800));
    }
  };
  const kill = async () => {
    for (let kills = 0; kills < size.kills; kills += 1) {
      await pause(between(random, isFull ? 800 : 500, isFull ? 3500 : 1800));
      await bench.server.kill();
      await pause(between(random, 0, 600));
      await bench.server.restart();
    }
  };

  for (const { line } of writers) line.loss = 0.06;
  const began = Date.now();
  await Promise.all([
    kill().finally(() => (killing = false)),
    ...writers.map((writer, at) => write(writer, at === 0 ? 'lead' : 'other')),
    ...writers.map(disturb),
  ]);
  for (const { line } of writers) line.loss = 0;
  const underFire = Date.now() - began;

  const rows = () =>
    bench.rows<StoredRow>(
      'SELECT m.event_number, m.author_id, m.client_key, m.text, t.subject_key FROM message m' +
        ' JOIN thread t ON t.id = m.thread_id ORDER BY m.event_number',
    );
  const emptied = await until('both outboxes are empty', () => writers.every(hasSentAll), converge);
  const head = (await rows()).at(-1)?.event_number ?? 0;
  const converged =
    emptied +
    (await until('both know everything', () => writers.every((one) => knowsAll(one, head)), converge));

  const stored = await rows();
  const sent = writers.flatMap((writer) => writer.written);
  report(
    `${stored.length} stored of ${sent.length} written in ${(underFire / 1000).toFixed(1)} s; ` +
      `${size.kills} kills; cuts ${sum((line) => line.cuts)}, reloads ${writers.map(({ reloads }) => reloads).join(' + ')}, ` +
      `signed out ${writers.map(({ signedOut }) => signedOut).join(' + ')}, ` +
      `requests lost ${sum((line) => line.requestsLost)}, replies lost ${sum((line) => line.repliesLost)} ` +
      `(${sum((line) => line.donesLost)} of them after the server had written); outboxes empty after ${emptied} ms, both equal after ${converged} ms`,
  );
  expect(sent).toHaveLength(size.messages);
  // None lost, none twice.
  expect(stored.map((row) => row.client_key).sort()).toEqual(sent.map((one) => one.clientKey).sort());
  // Each author's messages in the order in which they were written, thread by thread.
  for (const { person, written } of writers) {
    for (const subject of [main, side]) {
      const key = `residue:${project.proteinId}:${subject.kind === 'residue' ? subject.residueIndex : 0}`;
      const theirs = stored.filter((row) => row.author_id === person.id && row.subject_key === key);
      expect(theirs.map((row) => row.text)).toEqual(
        written.filter((one) => one.subject === subject).map((one) => one.text),
      );
    }
  }
  // The same list on both, equal to the database's.
  for (const writer of writers) {
    for (const subject of [main, side]) {
      const view = await writer.page.readToTheBeginning(subject);
      const shown = view.messages.map(({ eventNumber, by, clientKey, text }) => [
        eventNumber,
        by.id,
        clientKey,
        text,
      ]);
      const there = stored
        .filter((row) => row.subject_key === view.thread?.subjectKey)
        .map((row) => [row.event_number, row.author_id, row.client_key, row.text]);
      expect(shown).toEqual(there);
      expect(view.thread?.messageCount).toBe(there.length);
    }
  }
});

test('after the kills the events have numbers without a gap, and are what live clients took in', async () => {
  const numbers = await bench.rows<{ event_number: number }>(
    'SELECT event_number FROM project_event WHERE project_id = ? ORDER BY event_number',
    [project.projectId],
  );
  const [head] = await bench.rows<{ event_number: number }>('SELECT event_number FROM stream_head');
  expect(numbers.map((row) => row.event_number)).toEqual(
    Array.from({ length: head?.event_number ?? 0 }, (_, at) => at + 1),
  );
  for (const { person, device } of writers) {
    const asked = await eventsAfter(person, project.projectId, device.firstEvent);
    expect(device.seen).toEqual(asked);
    // Nothing is announced that was not stored as it was announced.
    for (const event of device.heard) expect(event).toEqual(asked[event.eventNumber - device.firstEvent - 1]);
    report(`${asked.length} events asked for, ${device.heard.length} of them came by the socket`);
  }
});

const hasSentAll = ({ page, device }: Writer) =>
  device.subjects.every((subject) => page.waiting(subject) === 0);

const knowsAll = ({ page, device }: Writer, head: number) =>
  page.lastEvent >= head &&
  device.subjects.some((subject) => page.view(subject)?.thread?.lastMessage?.eventNumber === head);

function sum(of: (line: FaultyLine['counts']) => number): number {
  return writers.reduce((total, { line }) => total + of(line.counts), 0);
}
