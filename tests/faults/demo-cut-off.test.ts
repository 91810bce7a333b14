// The first start is killed while it loads the demo: the next one ends with one whole demo, seen by its people.
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import mysql, { type RowDataPacket } from 'mysql2/promise';
import { makeScenario } from '@/shared/scenario/scenario';
import {
  alignments,
  annotations,
  auth,
  plans,
  projects,
  structures,
  teams,
  threads,
} from '@/shared/contracts';
import { createFreshDatabase } from '@/tests/support/fresh-database';
import { ask, mustAsk } from '@/tests/support/person';
import { demoPassword, launchServerProcess } from '@/tests/support/server-process';
import { isFull, report, until } from '@/tests/support/size';

/** Killed when the half-loaded demo has come so far: the name of a table and how many rows it has by then. */
const moments: [table: string, rows: number][] = isFull
  ? [
      ['person', 2],
      ['team', 1],
      ['project', 1],
      ['project_member', 3],
      ['upload', 1],
      ['upload', 3],
      ['alignment', 2],
      ['numbering', 30],
      ['structure', 1],
      ['annotation', 2],
      ['message', 3],
      ['construct', 1],
      ['mutant', 1],
    ]
  : [
      ['upload', 2],
      ['message', 2],
    ];

test(`killed ${moments.length} times on the way, the demo is whole and there once`, async () => {
  const database = await createFreshDatabase();
  const dataDir = await mkdtemp(path.join(tmpdir(), 'locant-demo-'));
  const settings = { JOB_LEASE_SECONDS: '2' };
  const server = await launchServerProcess({ databaseUrl: database.url, dataDir, demo: true, settings });
  const connection = await mysql.createConnection({ uri: database.url });
  const count = async (table: string) => {
    const found = await connection
      .query<RowDataPacket[]>(`SELECT COUNT(*) AS found FROM \`${table}\``)
      .catch(() => null); // before the tables are made
    return Number(found?.[0][0]?.found ?? 0);
  };
  try {
    for (const [table, rows] of moments) {
      // What an earlier, killed start left stays; this one adds to it.
      const before = table === 'person' ? 0 : await count(table);
      await until(`${rows} rows in ${table}`, async () => (await count(table)) >= before + rows, 60_000);
      await server.kill();
      report(`killed with ${await count(table)} rows in ${table}`);
      server.launch();
    }
    const began = Date.now();
    await server.ready();
    report(`the next start loaded the demo in ${Date.now() - began} ms`);
  } finally {
    await connection.end();
  }

  const scenario = makeScenario();
  for (const { email, role } of scenario.people) {
    const session = await mustAsk(server.origin, null, auth.signIn, {
      body: { email, password: demoPassword },
    });
    const token = session.accessToken;
    const seen = await mustAsk(server.origin, token, projects.list);
    expect(seen.map(({ name, role: own, invented }) => [name, own, invented])).toEqual([
      [scenario.project.name, role, true],
    ]);
    expect((await mustAsk(server.origin, token, teams.list)).length).toBeLessThanOrEqual(1);
    const params = { projectId: seen[0]?.id ?? '' };
    const members = await mustAsk(server.origin, token, projects.members, { params });
    expect(members).toHaveLength(scenario.people.length);
    const { story } = scenario;
    expect(await mustAsk(server.origin, token, alignments.list, { params })).toHaveLength(
      scenario.alignments.length,
    );
    expect(await mustAsk(server.origin, token, structures.list, { params })).toHaveLength(1);
    const listed = await mustAsk(server.origin, token, annotations.list, { params, query: { limit: 100 } });
    expect(listed.annotations).toHaveLength(story.annotations.length);
    const spoken = await mustAsk(server.origin, token, threads.list, { params });
    expect(spoken.threads.map(({ messageCount }) => messageCount).sort()).toEqual(
      story.threads.map(({ messages }) => messages.length).sort(),
    );
    expect(await mustAsk(server.origin, token, plans.mutants, { params })).toHaveLength(story.mutants.length);
  }
  // Once loaded, it stays as it is.
  const session = await mustAsk(server.origin, null, auth.signIn, {
    body: { email: scenario.people[0]?.email ?? '', password: demoPassword },
  });
  const head = async () =>
    (await ask(server.origin, session.accessToken, projects.list)).body.map((one) => one.head);
  const before = await head();
  await server.restart();
  expect(await head()).toEqual(before);

  await server.stop();
  await database.drop();
  await rm(dataDir, { recursive: true, force: true });
});
