import { randomUUID, createHash } from 'node:crypto';
import jwt from 'jsonwebtoken';
import { auth, projects } from '@/shared/contracts';
import { ask, mustAsk } from '@/tests/support/person';
import { startTestServer, testSecret, type TestServer } from '@/tests/support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const password = 'a long enough password';

/** What a browser keeps: the cookie it was last given. */
class Browser {
  cookie = '';
  readonly email = `${randomUUID()}@lab.example`;

  async signUp(): Promise<string> {
    const answer = await this.send(auth.signUp, { email: this.email, name: 'Ada Vold', password });
    if (answer.status !== 201) throw new Error(JSON.stringify(answer.body));
    return (answer.body as { accessToken: string }).accessToken;
  }

  async send(endpoint: typeof auth.signUp | typeof auth.signIn | typeof auth.renew, body: object = {}) {
    const answer = await ask(server.origin, null, endpoint as typeof auth.renew, {
      body: body as never,
      headers: this.cookie ? { cookie: this.cookie } : {},
    });
    this.cookie = cookieOf(answer.headers) ?? this.cookie;
    return answer;
  }

  /** Without taking the new cookie in: another tab that still holds the old one. */
  renewWith(cookie: string, headers: Record<string, string> = {}) {
    return ask(server.origin, null, auth.renew, { headers: { cookie, ...headers } });
  }
}

const cookieOf = (headers: Headers): string | undefined =>
  /^[^;]+/.exec(headers.get('set-cookie') ?? '')?.[0];
const me = (token: string) => ask(server.origin, token, auth.me);
const tokenHash = (cookie: string) =>
  createHash('sha256')
    .update(cookie.slice(cookie.indexOf('=') + 1))
    .digest('hex');

/** As if the grace had passed since the token was replaced. */
const ageReplacement = (cookie: string, seconds: number) =>
  server.container.source.query(
    'UPDATE session SET replaced_at = DATE_SUB(replaced_at, INTERVAL ? SECOND) WHERE token_hash = ?',
    [seconds, tokenHash(cookie)],
  );

test('the renewing token is a cookie that scripts and other sites cannot use, and only its hash is stored', async () => {
  const browser = new Browser();
  const body = { email: browser.email, name: 'Ada Vold', password };
  const { headers } = await ask(server.origin, null, auth.signUp, { body });
  const cookie = headers.get('set-cookie') ?? '';
  expect(cookie).toMatch(/; HttpOnly/);
  expect(cookie).toMatch(/; SameSite=Strict/);
  expect(cookie).toMatch(/; Path=\/api\/v1\/auth(;|$)/);
  const token = cookieOf(headers)?.split('=')[1] ?? '';
  expect(token.length).toBeGreaterThanOrEqual(43);
  const rows: object[] = await server.container.source.query('SELECT * FROM session');
  expect(JSON.stringify(rows)).toContain(createHash('sha256').update(token).digest('hex'));
  expect(JSON.stringify(rows)).not.toContain(token);
});

test('each renewal gives a new token and a working access token', async () => {
  const browser = new Browser();
  await browser.signUp();
  const first = browser.cookie;
  const { status, body } = await browser.send(auth.renew);
  expect(status).toBe(200);
  expect(browser.cookie).not.toBe(first);
  expect((await me(body.accessToken)).body).toMatchObject({ email: browser.email, name: 'Ada Vold' });
  expect((await browser.send(auth.renew)).status).toBe(200);
});

test('two renewals with one token both succeed, and both successors go on', async () => {
  const browser = new Browser();
  await browser.signUp();
  const shared = browser.cookie;
  const [one, other] = await Promise.all([browser.renewWith(shared), browser.renewWith(shared)]);
  expect([one.status, other.status]).toEqual([200, 200]);
  for (const answer of [one, other]) {
    const again = await browser.renewWith(cookieOf(answer.headers) ?? '');
    expect(again.status).toBe(200);
    expect((await me(again.body.accessToken)).status).toBe(200);
  }
});

test('five tabs renewing at once: nobody is signed out', async () => {
  const browser = new Browser();
  await browser.signUp();
  for (let round = 0; round < 4; round += 1) {
    const answers = await Promise.all(Array.from({ length: 5 }, () => browser.renewWith(browser.cookie)));
    expect(answers.map(({ status }) => status)).toEqual([200, 200, 200, 200, 200]);
    browser.cookie = cookieOf(answers[round]?.headers ?? new Headers()) ?? '';
  }
  expect((await browser.send(auth.renew)).status).toBe(200);
});

test('a used token that comes back after the grace ends everything that came from the sign-in', async () => {
  const browser = new Browser();
  const access = await browser.signUp();
  const stolen = browser.cookie;
  await browser.send(auth.renew);
  await ageReplacement(stolen, 11);
  const reused = await browser.renewWith(stolen);
  expect(reused.status).toBe(401);
  expect(reused.headers.get('set-cookie')).toBeNull();
  expect((await browser.send(auth.renew)).status).toBe(401);
  expect((await me(access)).status).toBe(401);
  // Another sign-in of the same person goes on.
  const elsewhere = new Browser();
  expect((await elsewhere.send(auth.signIn, { email: browser.email, password })).status).toBe(200);
  expect((await elsewhere.send(auth.renew)).status).toBe(200);
});

test('just within the grace a used token still renews', async () => {
  const browser = new Browser();
  await browser.signUp();
  const first = browser.cookie;
  await browser.send(auth.renew);
  await ageReplacement(first, 5);
  expect((await browser.renewWith(first)).status).toBe(200);
});

test('signing out ends the sign-in: the cookie goes, no tab renews, the access token ends', async () => {
  const browser = new Browser();
  const access = await browser.signUp();
  const otherTab = browser.cookie;
  const out = await ask(server.origin, null, auth.signOut, { headers: { cookie: browser.cookie } });
  expect(out.status).toBe(200);
  expect(out.headers.get('set-cookie')).toMatch(/locant_session=;.*Expires=Thu, 01 Jan 1970/);
  expect((await browser.renewWith(otherTab)).status).toBe(401);
  expect((await me(access)).status).toBe(401);
});

test('an expired renewing token does not renew', async () => {
  const browser = new Browser();
  await browser.signUp();
  await server.container.source.query(
    'UPDATE session SET expires_at = NOW(3) - INTERVAL 1 SECOND WHERE token_hash = ?',
    [tokenHash(browser.cookie)],
  );
  expect((await browser.send(auth.renew)).status).toBe(401);
});

test('renewing without a cookie, or with a made-up one, asks to sign in', async () => {
  const answers = await Promise.all([
    ask(server.origin, null, auth.renew),
    ask(server.origin, null, auth.renew, { headers: { cookie: `locant_session=${'A'.repeat(43)}` } }),
    ask(server.origin, null, auth.renew, { headers: { cookie: `locant_session=' OR 1=1 --` } }),
  ]);
  expect(answers.map(({ status }) => status)).toEqual([401, 401, 401]);
});

describe('access tokens', () => {
  let personId: string;
  let family: string;
  let good: string;
  beforeAll(async () => {
    good = await new Browser().signUp();
    const claims = jwt.decode(good) as { sub: string; fam: string };
    personId = claims.sub;
    family = claims.fam;
  });

  const make = (claims: object, options: jwt.SignOptions = {}, secret = testSecret) =>
    jwt.sign({ typ: 'access', fam: family, ...claims }, secret, {
      algorithm: 'HS256',
      audience: 'locant',
      subject: personId,
      expiresIn: 60,
      ...options,
    });
  const unsigned = () => {
    const part = (value: object) => Buffer.from(JSON.stringify(value)).toString('base64url');
    const payload = { typ: 'access', fam: family, sub: personId, aud: 'locant', exp: Date.now() / 1000 + 60 };
    return `${part({ alg: 'none', typ: 'JWT' })}.${part(payload)}.`;
  };

  test('one made as the server makes them is taken', async () => {
    expect((await me(make({}))).status).toBe(200);
  });

  test.each([
    ['signed with another secret', () => make({}, {}, 'another secret, long enough to be one at all')],
    ['without an algorithm', unsigned],
    ['of another algorithm', () => make({}, { algorithm: 'HS512' })],
    ['for another audience', () => make({}, { audience: 'elsewhere' })],
    ['of another type', () => make({ typ: 'renew' })],
    ['that has run out a second ago', () => make({}, { expiresIn: -1 })],
    ['of a sign-in that never was', () => make({ fam: randomUUID() })],
    [
      'with a changed payload',
      () =>
        good.replace(
          /\.[^.]+\./,
          `.${Buffer.from(`{"sub":"${personId}","typ":"access","aud":"locant","exp":9999999999,"fam":"${family}"}`).toString('base64url')}.`,
        ),
    ],
    ['that is no token', () => 'Bearer nonsense'],
    ['that is empty', () => ''],
  ])('one %s is refused', async (_, token) => {
    const answer = await ask(server.origin, null, projects.list, {
      headers: { authorization: `Bearer ${token()}` },
    });
    expect(answer.status).toBe(401);
    expect(answer.body).toMatchObject({ code: 'sign-in-needed', status: 401 });
  });
});

test('an unknown account and a wrong password get the same answer', async () => {
  const browser = new Browser();
  await browser.signUp();
  const wrong = await ask(server.origin, null, auth.signIn, {
    body: { email: browser.email, password: 'not that one' },
  });
  const unknown = await ask(server.origin, null, auth.signIn, {
    body: { email: `${randomUUID()}@lab.example`, password: 'not that one' },
  });
  const said = ({ status, body, headers }: typeof wrong) => {
    const { requestId: _, ...rest } = body;
    return { status, rest, cookie: headers.get('set-cookie') };
  };
  expect(said(unknown)).toEqual(said(wrong));
  expect(wrong.status).toBe(401);
});

test('an unknown account takes the same kind of time as a wrong password', async () => {
  const browser = new Browser();
  await browser.signUp();
  const time = async (email: string) => {
    const begun = performance.now();
    await ask(server.origin, null, auth.signIn, { body: { email, password: 'not that one' } });
    return performance.now() - begun;
  };
  const known: number[] = [];
  const unknown: number[] = [];
  for (let round = 0; round < 7; round += 1) {
    known.push(await time(browser.email));
    unknown.push(await time(`${randomUUID()}@lab.example`));
  }
  const quickest = (times: number[]) => Math.min(...times);
  // Hashing takes tens of milliseconds; an answer without it would take a few.
  expect(quickest(unknown)).toBeGreaterThan(quickest(known) / 2);
});

test('an address has one account, whatever its capitals, and a second sign-up says so without naming anybody', async () => {
  const browser = new Browser();
  await browser.signUp();
  const answer = await ask(server.origin, null, auth.signUp, {
    body: { email: browser.email.toUpperCase(), name: 'Somebody else', password },
  });
  expect(answer.status).toBe(409);
  expect(answer.body).toMatchObject({ code: 'email-taken' });
  expect(JSON.stringify(answer.body)).not.toContain('Ada');
});

test('of two sign-ups at once with one address, one makes the account', async () => {
  const body = { email: `${randomUUID()}@lab.example`, name: 'Twice', password };
  const answers = await Promise.all([1, 2, 3].map(() => ask(server.origin, null, auth.signUp, { body })));
  expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409]);
});

test.each([
  ['a password of nine characters', { password: 'ninechars' }, 'password'],
  ['a password of 10,000 characters', { password: 'x'.repeat(10_000) }, 'password'],
  ['no address', { email: 'nobody' }, 'email'],
  ['an address of 10,000 characters', { email: `${'x'.repeat(10_000)}@lab.example` }, 'email'],
  ['an empty name', { name: '   ' }, 'name'],
  ['a name of 10,000 characters', { name: 'x'.repeat(10_000) }, 'name'],
  ['a name of two lines', { name: 'one\ntwo' }, 'name'],
  ['an object for a password', { password: { $gt: '' } }, 'password'],
  ['a field nobody asked for', { isLead: true }, ''],
])('%s is refused where it stands', async (_, change, path) => {
  const body = { email: `${randomUUID()}@lab.example`, name: 'Ada Vold', password, ...change };
  const answer = await ask(server.origin, null, auth.signUp, { body: body as never });
  expect(answer.status).toBe(400);
  expect(answer.body.fields?.map((field) => field.path)).toEqual([path]);
});

test('a name with markup stays the text it is', async () => {
  const body = { email: `${randomUUID()}@lab.example`, name: '<script>alert(1)</script>', password };
  const { person } = await mustAsk(server.origin, null, auth.signUp, { body });
  expect(person.name).toBe(body.name);
});

describe('pages of other sites', () => {
  const foreign = { origin: 'https://evil.example' };
  test('cannot sign up, in, renew or out for somebody', async () => {
    const browser = new Browser();
    await browser.signUp();
    const body = { email: browser.email, password };
    const headers = { cookie: browser.cookie, ...foreign };
    const answers = await Promise.all([
      ask(server.origin, null, auth.signUp, { body: { ...body, name: 'x' }, headers }),
      ask(server.origin, null, auth.signIn, { body, headers }),
      ask(server.origin, null, auth.renew, { headers }),
      ask(server.origin, null, auth.signOut, { headers }),
      ask(server.origin, null, auth.renew, { headers: { ...headers, origin: 'null' } }),
    ]);
    expect(answers.map(({ status, body: { code } }) => [status, code])).toEqual(
      answers.map(() => [403, 'foreign-page']),
    );
    // None of it had an effect.
    expect((await browser.send(auth.renew)).status).toBe(200);
  });

  test('our own page can', async () => {
    const browser = new Browser();
    await browser.signUp();
    const answer = await browser.renewWith(browser.cookie, { origin: server.origin });
    expect(answer.status).toBe(200);
    expect(answer.headers.get('access-control-allow-origin')).toBeNull();
  });
});
