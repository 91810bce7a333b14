import { createHash, randomUUID } from 'node:crypto';
import jwt from 'jsonwebtoken';
import { auth, projects, threads } from '@/shared/contracts';
import { LiveClient } from '@/tests/support/live-client';
import { addMember, ask, signUp, type TestPerson } from '@/tests/support/person';
import { startTestServer, testSecret, type TestServer } from '@/tests/support/server';
import { stageAlignment, type Stage } from '@/tests/support/stage';

let server: TestServer;
let stage: Stage;
const opened: LiveClient[] = [];
beforeAll(async () => {
  server = await startTestServer();
  stage = await stageAlignment(server);
});
afterEach(() => {
  for (const client of opened.splice(0)) client.close();
});
afterAll(() => server.close());

const of = <More extends object>(more = {} as More) => ({ params: { projectId: stage.projectId, ...more } });
async function open(token: unknown, options?: Parameters<typeof LiveClient.open>[2]): Promise<LiveClient> {
  const client = await LiveClient.open(server, token, options);
  opened.push(client);
  return client;
}
async function joined(person: TestPerson): Promise<LiveClient> {
  const client = await open(person.token);
  expect(await client.join(stage.projectId)).toEqual({ head: expect.any(Number) });
  return client;
}
const post = (by: TestPerson, text = 'Is this the one?') =>
  by.must(threads.post, {
    ...of(),
    body: {
      clientKey: randomUUID(),
      subject: { kind: 'residue', proteinId: stage.protein('ATPE_ECOLI').id, residueIndex: 60 },
      text,
    },
  });
const textsOf = (client: LiveClient) =>
  client.events.map(({ payload }) => (payload as { message?: { text: string } }).message?.text);
/** Long enough for something to arrive that must not. */
const aWhile = () => new Promise((done) => setTimeout(done, 150));

test('a message arrives in the other browser, whole and with its number', async () => {
  const other = await addMember(stage.lead, stage.projectId, 'reader');
  const [mine, theirs] = [await joined(stage.lead), await joined(other)];
  const { message, thread } = await post(stage.lead);
  await theirs.until(() => theirs.events.length > 0);
  await mine.until(() => mine.events.length > 0);
  expect(theirs.events).toEqual([
    {
      projectId: stage.projectId,
      eventNumber: message.eventNumber,
      kind: 'message.posted',
      subjectId: message.id,
      actor: { id: stage.lead.id, name: 'The lead' },
      at: message.at,
      payload: { message, thread },
    },
  ]);
  expect(mine.events).toEqual(theirs.events);
});

test('events of many writes at once arrive in the order of their numbers, each once', async () => {
  const client = await joined(stage.lead);
  const { head } = await stage.lead.must(projects.read, of());
  await Promise.all(Array.from({ length: 40 }, (_, at) => post(stage.lead, `Message ${at}`)));
  await client.until(() => client.events.length >= 40);
  await aWhile();
  expect(client.events.map(({ eventNumber }) => eventNumber)).toEqual(
    Array.from({ length: 40 }, (_, at) => head + 1 + at),
  );
});

test('what was missed is caught up from the last number, equal to what was heard live', async () => {
  const client = await joined(stage.lead);
  const away = await joined(stage.lead);
  away.close();
  const { head } = await stage.lead.must(projects.read, of());
  for (const text of ['one', 'two', 'three']) await post(stage.lead, text);
  await client.until(() => client.events.length === 3);
  const missed = await stage.lead.must(projects.events, { ...of(), query: { after: head } });
  expect(missed).toEqual({ events: client.events, head: head + 3, readAfresh: false });
  const rest = await stage.lead.must(projects.events, { ...of(), query: { after: head + 2 } });
  expect(rest.events).toEqual(client.events.slice(2));
  const back = await open(stage.lead.token);
  expect(await back.join(stage.projectId)).toEqual({ head: head + 3 });
});

test('whoever is ahead of the server, or at no number, reads afresh or is refused', async () => {
  const { head } = await stage.lead.must(projects.read, of());
  const ahead = await stage.lead.must(projects.events, { ...of(), query: { after: head + 1 } });
  expect(ahead).toEqual({ events: [], head, readAfresh: true });
  for (const after of ['-1', 'x', '1.5', '1e99']) {
    const answer = await stage.lead.ask(projects.events, { ...of(), query: { after } as never });
    expect([after, answer.status]).toEqual([after, 400]);
  }
});

test('more events than are sent at once come in several parts', async () => {
  const busy = await stageAlignment(server, stage.lead);
  const params = { projectId: busy.projectId };
  const { head } = await stage.lead.must(projects.read, { params });
  const rows = Array.from({ length: 1200 }, (_, at) => [
    busy.projectId,
    head + 1 + at,
    'member.removed',
    randomUUID(),
    stage.lead.id,
    '{}',
    new Date(),
  ]);
  await server.container.source.query(
    'INSERT INTO project_event (project_id, event_number, kind, subject_id, actor_id, payload, at) VALUES ?',
    [rows],
  );
  await server.container.source.query('UPDATE stream_head SET event_number = ? WHERE project_id = ?', [
    head + 1200,
    busy.projectId,
  ]);
  const numbers: number[] = [];
  for (let after = head; after < head + 1200; after = numbers.at(-1) ?? Infinity) {
    const part = await stage.lead.must(projects.events, { params, query: { after } });
    expect(part.events.length).toBeGreaterThan(0);
    numbers.push(...part.events.map(({ eventNumber }) => eventNumber));
  }
  expect(numbers).toEqual(rows.map(([, number]) => number));
});

test('a member who is removed is cut from the project within a second, and cannot come back', async () => {
  const gone = await addMember(stage.lead, stage.projectId, 'contributor');
  const [client, second] = [await joined(gone), await joined(gone)];
  const stays = await joined(stage.lead);
  await stays.until(() => stays.people.length === 2);
  await stage.lead.must(projects.removeMember, of({ personId: gone.id }));
  const took = await client.until(() => client.left.includes(stage.projectId));
  await second.until(() => second.left.includes(stage.projectId));
  expect(took).toBeLessThan(1000);
  const heard = client.events.length;
  await post(stage.lead, 'Not for those who left.');
  await stays.until(() => textsOf(stays).includes('Not for those who left.'));
  await aWhile();
  expect([client.events.length, textsOf(second).includes('Not for those who left.')]).toEqual([heard, false]);
  expect(await client.join(stage.projectId)).toEqual({
    refused: 'There is no such project, or you may not see it.',
  });
  expect(stays.people).toEqual(['The lead']);
  // Added again, the same socket may join again.
  await stage.lead.must(projects.addMember, { ...of(), body: { email: gone.email, role: 'reader' } });
  expect(await client.join(stage.projectId)).toEqual({ head: expect.any(Number) });
});

test('a membership that ended without an event, in another process, ends with the next heartbeat', async () => {
  const gone = await addMember(stage.lead, stage.projectId, 'reader');
  const client = await joined(gone);
  await server.container.source.query('DELETE FROM project_member WHERE person_id = ?', [gone.id]);
  await client.until(() => client.left.includes(stage.projectId), 7000);
});

test('nobody joins a project of others, and nothing of it is heard', async () => {
  const outsider = await signUp(server);
  const client = await open(outsider.token);
  for (const projectId of [stage.projectId, randomUUID()]) {
    expect(await client.join(projectId)).toEqual({
      refused: 'There is no such project, or you may not see it.',
    });
  }
  expect(await client.join('project' as never)).toEqual({ refused: 'Which project?' });
  const inside = await joined(stage.lead);
  client.socket.emit('project:typing', { projectId: stage.projectId, subjectKey: 'x' });
  client.socket.emit('project:leave', { projectId: stage.projectId });
  await post(stage.lead, 'Inside.');
  await inside.until(() => textsOf(inside).includes('Inside.'));
  await aWhile();
  expect([client.events, client.people, inside.typing]).toEqual([[], [], []]);
});

test('typing is told to the others of the project', async () => {
  const other = await addMember(stage.lead, stage.projectId, 'contributor');
  const [mine, theirs] = [await joined(stage.lead), await joined(other)];
  theirs.socket.emit('project:typing', { projectId: stage.projectId, subjectKey: 'residue:x:1' });
  await mine.until(() => mine.typing.length > 0);
  expect(mine.typing).toEqual([{ subjectKey: 'residue:x:1', by: other.id }]);
  expect(theirs.typing).toEqual([]);
});

describe('a sign-in', () => {
  interface SignedIn {
    cookie: string;
    token: string;
    personId: string;
  }
  async function signedIn(): Promise<SignedIn> {
    const body = {
      email: `${randomUUID()}@lab.example`,
      name: 'Somebody',
      password: 'a long enough password',
    };
    const answer = await ask(server.origin, null, auth.signUp, { body });
    const cookie = /^[^;]+/.exec(answer.headers.get('set-cookie') ?? '')?.[0] ?? '';
    return { cookie, token: answer.body.accessToken, personId: answer.body.person.id };
  }

  test('that ends cuts its sockets, and only its own', async () => {
    const [one, other] = [await signedIn(), await signedIn()];
    const [client, stays] = [await open(one.token), await open(other.token)];
    await ask(server.origin, null, auth.signOut, { headers: { cookie: one.cookie } });
    expect(await client.until(() => !client.isOpen)).toBeLessThan(1000);
    expect(stays.isOpen).toBe(true);
    expect((await open(one.token)).refusal).toBe('sign-in-needed');
  });

  test('whose used token came back is cut', async () => {
    const { cookie, token } = await signedIn();
    const client = await open(token);
    await ask(server.origin, null, auth.renew, { headers: { cookie } });
    expect(client.isOpen).toBe(true);
    const hash = createHash('sha256')
      .update(cookie.split('=')[1] ?? '')
      .digest('hex');
    await server.container.source.query(
      'UPDATE session SET replaced_at = DATE_SUB(replaced_at, INTERVAL 11 SECOND) WHERE token_hash = ?',
      [hash],
    );
    await ask(server.origin, null, auth.renew, { headers: { cookie } });
    expect(await client.until(() => !client.isOpen)).toBeLessThan(1000);
  });

  test('whose token runs out closes the socket then', async () => {
    const { token, personId } = await signedIn();
    const { fam } = jwt.decode(token) as { fam: string };
    const sign = (seconds: number) =>
      jwt.sign({ typ: 'access', fam }, testSecret, {
        audience: 'locant',
        subject: personId,
        expiresIn: seconds,
      });
    const client = await open(sign(1));
    expect(client.isOpen).toBe(true);
    await client.until(() => !client.isOpen, 2500);
  });

  test.each([
    ['no token', undefined],
    ['a number', 7],
    ['an object', { $gt: '' }],
    ['nonsense', 'nonsense'],
    [
      'a token of another secret',
      jwt.sign({ typ: 'access' }, 'another secret that is long enough to be one', {
        audience: 'locant',
        subject: 'x',
        expiresIn: 60,
      }),
    ],
  ])('with %s opens no socket', async (_, token) => {
    const client = await open(token);
    expect([client.isOpen, client.refusal]).toEqual([false, 'sign-in-needed']);
  });
});

test.each(['websocket', 'polling'] as const)(
  'a page of another site opens no socket (%s)',
  async (transport) => {
    for (const origin of ['https://evil.example', 'null', `${server.origin}.evil.example`]) {
      const client = await open(stage.lead.token, { origin, transport });
      expect([origin, client.isOpen]).toEqual([origin, false]);
      expect(client.refusal).not.toBeNull();
    }
    const own = await open(stage.lead.token, { origin: server.origin, transport });
    expect(own.isOpen).toBe(true);
  },
);

test('odd packets end no process, and no other socket', async () => {
  const other = await joined(stage.lead);
  const raw = await open(stage.lead.token);
  const emit = raw.socket.emit.bind(raw.socket) as (name: string, ...values: unknown[]) => void;
  const odd = [
    undefined,
    null,
    7,
    'x',
    [],
    {},
    { projectId: {} },
    { projectId: [stage.projectId] },
    Buffer.from('x'),
    () => {},
  ];
  for (const name of [
    'project:join',
    'project:leave',
    'project:typing',
    'no:such',
    '__proto__',
    'constructor',
  ]) {
    emit(name);
    for (const one of odd) {
      emit(name, one);
      emit(name, one, one, one);
    }
  }
  await aWhile();
  // Below the client: frames that are no packets.
  for (const frame of [
    '',
    'x',
    '42',
    '42[',
    '42["project:join"',
    '420["project:join",{}]',
    '45-["x"]',
    '9',
    '4'.repeat(70_000),
    '44"x"',
    '41',
    '40{"token":7}',
  ]) {
    for (const transport of ['websocket', 'polling'] as const) {
      const client = await open(stage.lead.token, { transport });
      client.socket.io.engine.write(frame);
    }
  }
  await aWhile();
  await post(stage.lead, 'Still here.');
  await other.until(() => textsOf(other).includes('Still here.'));
  expect((await fetch(`${server.origin}/healthz`)).status).toBe(200);
});
