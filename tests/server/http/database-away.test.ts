// The database goes away and comes back: meanwhile the server says so at once, afterwards it heals by itself.
import { randomUUID } from 'node:crypto';
import { teams } from '@/shared/contracts';
import { cutLine, type CutLine } from '@/tests/support/cut-line';
import { createFreshDatabase, type FreshDatabase } from '@/tests/support/fresh-database';
import { signUp, type TestPerson } from '@/tests/support/person';
import { startTestServer, type TestServer } from '@/tests/support/server';

let database: FreshDatabase;
let line: CutLine;
let server: TestServer;
let person: TestPerson;
beforeAll(async () => {
  database = await createFreshDatabase();
  line = await cutLine(database.url);
  server = await startTestServer({ DATABASE_URL: line.url });
  person = await signUp(server);
});
afterAll(async () => {
  line.mend();
  await server.close();
  await line.close();
  await database.drop();
});

const ready = async () => (await fetch(`${server.origin}/readyz`)).status;
const make = (key?: string) => person.ask(teams.make, { body: { name: 'A team' }, ...(key && { key }) });

test('meanwhile it is alive and not ready, and refuses at once with when to come back', async () => {
  const key = randomUUID();
  line.cut();
  const begun = performance.now();
  const answers = await Promise.all([person.ask(teams.list), make(), make(key)]);
  expect(performance.now() - begun).toBeLessThan(2000);
  for (const { status, body, headers } of answers) {
    expect([status, body.code, headers.get('retry-after')]).toEqual([503, 'busy', '2']);
  }
  expect([(await fetch(`${server.origin}/healthz`)).status, await ready()]).toEqual([200, 503]);

  line.mend();
  const back = performance.now();
  while ((await ready()) !== 200) await new Promise((done) => setTimeout(done, 50));
  expect(performance.now() - back).toBeLessThan(5000);
  expect(await person.must(teams.list)).toEqual([]);
  const made = await make(key);
  expect(made.status).toBe(201);
  expect(await make(key)).toMatchObject({ status: 201, body: made.body });
  expect(await person.must(teams.list)).toHaveLength(1);
});

test('connections that died while nobody asked are noticed by nobody', async () => {
  await Promise.all(Array.from({ length: 20 }, () => person.must(teams.list)));
  line.cut();
  await new Promise((done) => setTimeout(done, 100));
  line.mend();
  const answers = await Promise.all(Array.from({ length: 20 }, () => make()));
  expect(answers.map(({ status }) => status)).toEqual(answers.map(() => 201));
});
