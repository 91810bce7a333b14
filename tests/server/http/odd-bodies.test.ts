// Bodies that are JSON and still no use: half a character, nesting without end. Neither may be our fault.
import { teams } from '@/shared/contracts';
import { createFreshDatabase, type FreshDatabase } from '@/tests/support/fresh-database';
import { signUp, type TestPerson } from '@/tests/support/person';
import { startTestServer, type TestServer } from '@/tests/support/server';

let database: FreshDatabase;
let server: TestServer;
let person: TestPerson;
beforeAll(async () => {
  database = await createFreshDatabase();
  server = await startTestServer({ DATABASE_URL: database.url });
  person = await signUp(server);
});
afterAll(async () => {
  await server.close();
  await database.drop();
});

test('half a character becomes the sign for it, whole ones stay', async () => {
  const made = await person.ask(teams.make, { body: { name: 'cut \ud83e, whole \u{1f9ec}' } });
  expect([made.status, made.body.name]).toEqual([201, 'cut \ufffd, whole \u{1f9ec}']);
});

test('nesting without end is refused in words', async () => {
  for (const [open, close] of [
    ['[', ']'],
    ['{"a":', '}'],
  ] as const) {
    const body = `{"name":${open.repeat(100_000)}1${close.repeat(100_000)}}`;
    const answer = await fetch(`${server.origin}/api/v1/teams`, {
      method: 'POST',
      headers: { 'content-type': 'application/json', authorization: `Bearer ${person.token}` },
      body,
    });
    const problem = (await answer.json()) as { code: string };
    expect([answer.status, problem.code]).toEqual([400, 'bad-request']);
  }
});

test('a name that cannot be seen, or that turns the writing direction, is refused at its field', async () => {
  for (const name of ['\u200b\u200b', '\u2060', 'annotated \u202egnp.', 'a\u2067b']) {
    const made = await person.ask(teams.make, { body: { name } });
    expect([made.status, made.body.fields?.[0]?.path]).toEqual([400, 'name']);
  }
  for (const name of ['βγ', 'Équipe n° 1', '\u{1f9ec}', "c′ + c''", 'می‌خواهم']) {
    expect((await person.ask(teams.make, { body: { name } })).status).toBe(201);
  }
});
