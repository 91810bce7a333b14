import { Access } from '@/client/access';
import { createApi } from '@/client/api';
import { ActKeys } from '@/client/act-keys';
import { conflictOf, offline, readProblem, type ApiProblem } from '@/client/problem';
import { createSession } from '@/client/session';
import { families, plans, protein, threads, uploads } from '@/shared/contracts';
import { idOf, protein as someProtein } from './support/contract-values';

const projectId = idOf(7);
const person = { id: idOf(900), email: 'ines@lab.example', name: 'Ines' };
const sessionOf = (accessToken: string, who = person) => ({
  person: who,
  accessToken,
  expiresAt: '2026-01-01T00:10:00.000Z',
});
const problemOf = (status: number, more: object = {}) => ({
  type: `/problems/p${status}`,
  title: 'No',
  status,
  code: `p${status}`,
  detail: `Refused ${status}.`,
  requestId: 'r',
  ...more,
});

interface Asked {
  address: string;
  method: string;
  headers: Record<string, string>;
  body: unknown;
}
type Answer = { status: number; body: unknown; headers?: Record<string, string> } | 'cut';

/** An API whose line is a function: what was asked is kept, the answer is chosen. */
function apiWith(answer: (asked: Asked) => Answer | Promise<Answer>, locks?: LockManager) {
  const asked: Asked[] = [];
  const access = new Access();
  const fetch = async (address: string, init: RequestInit): Promise<Response> => {
    const one = {
      address,
      method: init.method ?? '',
      headers: init.headers as Record<string, string>,
      body: typeof init.body === 'string' ? JSON.parse(init.body) : undefined,
    };
    asked.push(one);
    const given = await answer(one);
    if (given === 'cut') throw new TypeError('Failed to fetch');
    const text = typeof given.body === 'string' ? given.body : JSON.stringify(given.body);
    return new Response(text, { status: given.status, headers: given.headers });
  };
  const api = createApi({ access, fetch, locks });
  return { api, access, asked, session: createSession(access, api) };
}

const isRenewal = ({ address }: Asked) => address === '/api/v1/auth/renew';
const caught = async (promise: Promise<unknown>): Promise<ApiProblem> =>
  promise.then(
    () => {
      throw new Error('It should have been refused.');
    },
    (error: ApiProblem) => error,
  );

describe('a call', () => {
  test('is made as the endpoint declares it', async () => {
    const { api, access, asked } = apiWith(() => ({ status: 200, body: someProtein({ version: 4 }) }));
    access.accept(sessionOf('t1'));
    const reply = await api.call(families.renameProtein, {
      params: { projectId, proteinId: idOf(1) },
      version: 3,
      body: { organism: 'Aquatilis marna' },
      idempotencyKey: 'key-1',
    });
    expect(reply.version).toBe(4);
    expect(asked).toEqual([
      {
        address: `/api/v1/projects/${projectId}/proteins/${idOf(1)}`,
        method: 'PATCH',
        headers: expect.objectContaining({
          Authorization: 'Bearer t1',
          'If-Match': '"3"',
          'Idempotency-Key': 'key-1',
          'Content-Type': 'application/json',
        }),
        body: { organism: 'Aquatilis marna' },
      },
    ]);
  });

  test('escapes what stands in the address and leaves out what is not given', async () => {
    const { api, access, asked } = apiWith(() => ({ status: 404, body: problemOf(404) }));
    access.accept(sessionOf('t1'));
    await caught(
      api.call(threads.ofSubject, {
        params: { projectId, subjectKey: 'residue:a/b?:1' },
        query: { before: undefined, limit: 5 },
      }),
    );
    expect(asked[0]?.address).toBe(`/api/v1/projects/${projectId}/threads/of/residue%3Aa%2Fb%3F%3A1?limit=5`);
  });

  test('of a versioned endpoint without a version is a mistake of ours and is not sent', async () => {
    const { api, access, asked } = apiWith(() => ({ status: 200, body: {} }));
    access.accept(sessionOf('t1'));
    const params = { projectId, proteinId: idOf(1) };
    await caught(api.call(families.renameProtein, { params, body: { organism: 'x' } }));
    expect(asked).toEqual([]);
  });

  test('throws the refusal with its words, and shows what stands there now', async () => {
    const current = someProtein({ version: 9 });
    const { api, access } = apiWith(() => ({ status: 412, body: problemOf(412, { current }) }));
    access.accept(sessionOf('t1'));
    const error = await caught(
      api.call(families.renameProtein, {
        params: { projectId, proteinId: idOf(1) },
        version: 3,
        body: { organism: 'x' },
      }),
    );
    expect(error.message).toBe('Refused 412.');
    expect(error.undecided).toBe(false);
    expect(conflictOf(error, protein)).toEqual(current);
    expect(conflictOf(offline(), protein)).toBeNull();
  });

  test('without an answer is "offline"; an answer that is none of ours gets words too', async () => {
    const cut = apiWith(() => 'cut');
    cut.access.accept(sessionOf('t1'));
    const list = { params: { projectId } };
    expect(await caught(cut.api.call(families.list, list))).toMatchObject({
      code: 'offline',
      undecided: true,
    });
    const odd = apiWith(() => ({ status: 200, body: '<html>' }));
    odd.access.accept(sessionOf('t1'));
    expect(await caught(odd.api.call(families.list, list))).toMatchObject({ code: 'reply-not-understood' });
    expect(readProblem(413, '<html>', null).message).toMatch(/larger/);
    expect(readProblem(503, '', '7')).toMatchObject({ undecided: true, retryAfterSeconds: 7 });
  });

  test('brings a text file with its name', async () => {
    const headers = { 'content-disposition': 'attachment; filename="primers.csv"' };
    const { api, access } = apiWith(() => ({ status: 200, body: 'name,bases\n', headers }));
    access.accept(sessionOf('t1'));
    const file = await api.downloadText(plans.primerList, { params: { projectId } });
    expect(file).toEqual({ text: 'name,bases\n', fileName: 'primers.csv' });
  });

  test('that writes carries a key of its own, that reads none', async () => {
    const { api, access, asked } = apiWith(() => ({ status: 200, body: [] }));
    access.accept(sessionOf('t1'));
    await api.call(uploads.list, { params: { projectId } });
    await caught(
      api.call(families.make, {
        params: { projectId },
        body: { name: 'c', aliases: [], part: 'rotor', catalytic: false },
      }),
    );
    expect(asked[0]?.headers['Idempotency-Key']).toBeUndefined();
    expect(asked[1]?.headers['Idempotency-Key']).toMatch(/^[0-9a-f-]{36}$/);
  });
});

describe('the access token', () => {
  test('is renewed once for many calls that were refused at once, each sent again under its own key', async () => {
    let renewals = 0;
    const { api, access, asked } = apiWith((one) => {
      if (isRenewal(one)) {
        renewals += 1;
        return { status: 200, body: sessionOf('t2') };
      }
      return one.headers.Authorization === 'Bearer t2'
        ? { status: 200, body: [] }
        : { status: 401, body: problemOf(401) };
    });
    access.accept(sessionOf('t1'));
    await Promise.all(Array.from({ length: 5 }, () => api.call(families.list, { params: { projectId } })));
    expect(renewals).toBe(1);
    expect(asked.filter((one) => !isRenewal(one))).toHaveLength(10);
  });

  test('keeps the key of an act over the renewal', async () => {
    const { api, access, asked } = apiWith((one) => {
      if (isRenewal(one)) return { status: 200, body: sessionOf('t2') };
      return { status: one.headers.Authorization === 'Bearer t2' ? 404 : 401, body: problemOf(404) };
    });
    access.accept(sessionOf('t1'));
    await caught(
      api.call(families.make, {
        params: { projectId },
        body: { name: 'c', aliases: [], part: 'rotor', catalytic: false },
      }),
    );
    const keys = asked.filter((one) => !isRenewal(one)).map((one) => one.headers['Idempotency-Key']);
    expect(keys).toHaveLength(2);
    expect(keys[0]).toBe(keys[1]);
  });

  test('that cannot be renewed ends the session as expired; a line that is down does not', async () => {
    let status = 0;
    const { api, access } = apiWith((one) =>
      isRenewal(one) && status === 0 ? 'cut' : { status: 401, body: problemOf(401) },
    );
    access.accept(sessionOf('t1'));
    expect(await caught(api.call(families.list, { params: { projectId } }))).toMatchObject({
      code: 'offline',
    });
    expect(access.read()).toEqual({ status: 'signed in', person });
    status = 401;
    await caught(api.call(families.list, { params: { projectId } }));
    expect(access.read()).toEqual({ status: 'signed out', expired: true });
    expect(access.token).toBeNull();
  });

  test('is renewed under a lock across tabs where the browser has one', async () => {
    const held: string[] = [];
    const locks = {
      request: async (name: string, work: () => Promise<unknown>) => {
        held.push(name);
        return work();
      },
    } as unknown as LockManager;
    const { api, access } = apiWith(
      (one) => (isRenewal(one) ? { status: 200, body: sessionOf('t2') } : { status: 200, body: [] }),
      locks,
    );
    await api.call(families.list, { params: { projectId } });
    expect(held).toEqual(['locant-renew']);
    expect(access.person).toEqual(person);
  });

  test('renewed while somebody signs out does not sign in again', async () => {
    let finish: (() => void) | undefined;
    const { session, access } = apiWith((one) => {
      if (!isRenewal(one)) return { status: 200, body: {} };
      return new Promise((resolve) => (finish = () => resolve({ status: 200, body: sessionOf('t2') })));
    });
    const restoring = session.restore();
    await session.signOut();
    finish?.();
    await restoring;
    expect(access.read()).toEqual({ status: 'signed out', expired: false });
    expect(access.token).toBeNull();
  });
});

describe('the session', () => {
  test('is taken up at the start, and asks again while the server is away', async () => {
    let isAway = true;
    const { session, access } = apiWith(() => (isAway ? 'cut' : { status: 200, body: sessionOf('t1') }));
    const states: string[] = [access.read().status];
    access.subscribe(() => states.push(access.read().status));
    const restoring = session.restore();
    await new Promise((done) => setTimeout(done, 20));
    isAway = false;
    session.retryNow();
    await restoring;
    expect(states).toEqual(['restoring', 'unreachable', 'signed in']);
  });

  test('without a cookie is signed out, and nothing more is asked', async () => {
    const { session, access, asked, api } = apiWith(() => ({ status: 401, body: problemOf(401) }));
    await session.restore();
    expect(access.read()).toEqual({ status: 'signed out', expired: false });
    await caught(api.call(families.list, { params: { projectId } }));
    expect(asked).toHaveLength(1);
  });

  test('cannot be ended without the server: the cookie would sign in again', async () => {
    const { session, access } = apiWith(() => 'cut');
    access.accept(sessionOf('t1'));
    expect(await caught(session.signOut())).toMatchObject({ code: 'offline' });
    expect(access.read().status).toBe('signed in');
  });

  test('tells screens of a person who comes or goes, not of a renewed token', async () => {
    const access = new Access();
    let told = 0;
    access.subscribe(() => (told += 1));
    access.accept(sessionOf('t1'));
    const held = access.read();
    access.accept(sessionOf('t2'));
    expect(told).toBe(1);
    expect(access.read()).toBe(held);
    access.accept(sessionOf('t3', { ...person, id: idOf(901) }));
    expect(told).toBe(2);
  });
});

test('the key of an act stays while nobody knows whether it was done, and changes after an answer', () => {
  const keys = new ActKeys();
  const first = keys.keyFor({ name: 'c' });
  keys.answered(offline());
  expect(keys.keyFor({ name: 'c' })).toBe(first);
  expect(keys.keyFor({ name: 'a' })).not.toBe(first);
  const second = keys.keyFor({ name: 'a' });
  keys.answered(readProblem(422, '', null));
  expect(keys.keyFor({ name: 'a' })).not.toBe(second);
  const third = keys.keyFor({ name: 'a' });
  keys.answered();
  expect(keys.keyFor({ name: 'a' })).not.toBe(third);
});
