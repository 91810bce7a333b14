// The database is killed under load and comes back: refusals in time meanwhile, healed without a new server.
import { randomUUID } from 'node:crypto';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { startDatabase } from '../../scripts/lib/database.mjs';
import { isFull, pause, report, until } from '@/tests/support/size';
import {
  eventsAfter,
  openWorkbench,
  shareProject,
  type SharedProject,
  type Workbench,
} from './support/workbench';
import { projects, threads } from '@/shared/contracts';

const rounds = isFull ? 10 : 2;
const answersWithin = 2000;
const healsWithin = 5000;

type Database = Awaited<ReturnType<typeof startDatabase>>;

let folder: string;
let database: Database;
let bench: Workbench;
let project: SharedProject;

// Durable: what was acknowledged must be there after the kill.
const start = () => startDatabase({ dir: folder, durable: true, allRights: true });

beforeAll(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'locant-database-'));
  database = await start();
  bench = await openWorkbench({}, { url: database.url, drop: async () => {} });
  project = await shareProject(bench.server);
});
afterAll(async () => {
  await bench.close();
  await database.stop();
  await rm(folder, { recursive: true, force: true });
});

async function killDatabase(): Promise<void> {
  process.kill(database.pid, 'SIGKILL');
  await until('the database is gone', () => isGone(database.pid), 5000);
}

function isGone(pid: number): boolean {
  try {
    process.kill(pid, 0);
    return false;
  } catch {
    return true;
  }
}

test(`a database killed and started again, ${rounds} times: 503 meanwhile, healed by itself, nothing lost or doubled`, async () => {
  const { projectId, contributor: author } = project;
  const subject = project.subjectAt(60);
  const acknowledged: string[] = [];
  const slowest = { refusal: 0, healed: 0 };
  let going = true;

  const post = (clientKey: string) =>
    author.ask(threads.post, {
      params: { projectId },
      body: { clientKey, subject, text: `message ${clientKey}` },
      key: clientKey,
    });
  // As a client does: the same key until the server took it.
  const write = async () => {
    while (going) {
      const clientKey = randomUUID();
      for (let taken = false; !taken && going;) {
        const { status, headers } = await post(clientKey);
        taken = status === 201;
        if (taken) acknowledged.push(clientKey);
        else expect([status, headers.get('retry-after')]).toEqual([503, expect.stringMatching(/^\d+$/)]);
        if (!taken) await pause(50);
      }
    }
  };
  const writing = Promise.all([write(), write(), write()]);
  // A refusal that is not handled would end the run before it is looked at.
  writing.catch(() => {});

  for (let round = 0; round < rounds; round += 1) {
    await pause(400);
    await killDatabase();
    for (let asked = 0; asked < 3; asked += 1) {
      for (const ask of [
        () => author.ask(projects.list),
        () => author.ask(projects.events, { params: { projectId }, query: { after: 0 } }),
        () => post(randomUUID()),
      ]) {
        const began = performance.now();
        const { status, headers, body } = await ask();
        slowest.refusal = Math.max(slowest.refusal, performance.now() - began);
        expect(status).toBe(503);
        expect(Number(headers.get('retry-after'))).toBeGreaterThan(0);
        expect(headers.get('content-type')).toMatch('application/problem+json');
        expect(body).toMatchObject({ code: 'busy', status: 503 });
      }
    }
    expect((await fetch(`${bench.server.origin}/readyz`)).status).toBe(503);
    expect((await fetch(`${bench.server.origin}/healthz`)).status).toBe(200);
    const pid = bench.server.pid;
    database = await start();
    const key = randomUUID();
    const healed = await until(
      'the server answers again',
      async () => (await post(key)).status === 201 && (await author.ask(projects.list)).status === 200,
      healsWithin,
    );
    acknowledged.push(key);
    slowest.healed = Math.max(slowest.healed, healed);
    expect(bench.server.pid).toBe(pid);
  }
  going = false;
  await writing;
  report(
    `${acknowledged.length} messages acknowledged over ${rounds} kills; slowest refusal ${Math.round(slowest.refusal)} ms, ` +
      `healed at most ${slowest.healed} ms after the database answered`,
  );
  expect(slowest.refusal).toBeLessThan(answersWithin);

  const stored = await bench.rows<{ client_key: string }>('SELECT client_key FROM message');
  const keys = stored.map((row) => row.client_key);
  expect(new Set(keys).size).toBe(keys.length);
  expect(keys).toEqual(expect.arrayContaining(acknowledged));
  const events = await eventsAfter(author, projectId, 0);
  expect(events.map((event) => event.eventNumber)).toEqual(events.map((_, at) => at + 1));
  expect(events.filter((event) => event.kind === 'message.posted')).toHaveLength(keys.length);
});

test('a file uploaded while the database is away is refused for a moment, and leaves nothing behind', async () => {
  const { projectId, lead, familyId } = project;
  await killDatabase();
  const bytes = Buffer.from('>one\nACDEF\n>two\nACDEF\n');
  const began = performance.now();
  const refused = await lead.upload(projectId, { kind: 'alignment', familyId }, 'small.afa', bytes);
  expect(performance.now() - began).toBeLessThan(answersWithin);
  expect(refused.status).toBe(503);
  database = await start();
  const key = randomUUID();
  await until(
    'the upload is taken',
    async () =>
      (await lead.upload(projectId, { kind: 'alignment', familyId }, 'small.afa', bytes, key)).status === 201,
    healsWithin,
  );
  // Jobs go on as well, without a new server.
  await until(
    'the file is read',
    async () =>
      (await bench.rows<{ state: string }>("SELECT state FROM upload WHERE file_name = 'small.afa'")).every(
        ({ state }) => state === 'done',
      ),
    healsWithin,
  );
  const uploads = await bench.rows("SELECT id FROM upload WHERE file_name = 'small.afa'");
  expect(uploads).toHaveLength(1);
});
