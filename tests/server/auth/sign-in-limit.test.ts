import { randomUUID } from 'node:crypto';
import { auth } from '@/shared/contracts';
import { ask } from '@/tests/support/person';
import { startTestServer, type TestServer } from '@/tests/support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ SIGN_IN_ATTEMPTS: '3' });
});
afterAll(() => server.close());

const attempt = (email: string) =>
  ask(server.origin, null, auth.signIn, { body: { email, password: 'guess' } });

test('guessing at one account, and spraying over many from one address, is stopped and told when to go on', async () => {
  const email = `${randomUUID()}@lab.example`;
  const atOne: number[] = [];
  for (let round = 0; round < 4; round += 1) atOne.push((await attempt(email)).status);
  expect(atOne).toEqual([401, 401, 401, 429]);
  const spelled = await attempt(email.toUpperCase());
  expect(spelled.status).toBe(429);
  expect(Number(spelled.headers.get('retry-after'))).toBeGreaterThan(0);
  expect(spelled.body).toMatchObject({ code: 'too-many-attempts' });
  const sprayed: number[] = [];
  for (let round = 0; round < 6; round += 1) {
    sprayed.push((await attempt(`${randomUUID()}@lab.example`)).status);
  }
  expect(sprayed).toEqual([401, 401, 401, 401, 429, 429]);
});
