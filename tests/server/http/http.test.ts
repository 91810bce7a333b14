// What surrounds the endpoints: health, addresses that lead nowhere, the client's files, headers, bodies.
import { mkdtempSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { connect } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import { problem, projects, teams } from '@/shared/contracts';
import { signUp, type TestPerson } from '@/tests/support/person';
import { startTestServer, type TestServer } from '@/tests/support/server';

let server: TestServer;
let person: TestPerson;
const folder = mkdtempSync(path.join(tmpdir(), 'locant-client-'));
const page = '<!doctype html><html lang="en"><title>Locant</title></html>';
beforeAll(async () => {
  mkdirSync(path.join(folder, '_expo/static/js/web'), { recursive: true });
  mkdirSync(path.join(folder, 'assets'));
  mkdirSync(path.join(folder, 'fonts'));
  writeFileSync(path.join(folder, 'index.html'), page);
  writeFileSync(path.join(folder, '_expo/static/js/web/entry-1a2b.js'), 'plain()');
  writeFileSync(path.join(folder, '_expo/static/js/web/entry-1a2b.js.gz'), gzipSync('packed()'));
  writeFileSync(path.join(folder, 'assets/picture-3c.png'), 'png');
  writeFileSync(path.join(folder, '.secret'), 'hidden');
  writeFileSync(path.join(folder, 'csp.json'), JSON.stringify({ styles: ['sha256-abc='] }));
  process.env.CLIENT_DIR = folder;
  server = await startTestServer();
  person = await signUp(server);
});
afterAll(async () => {
  delete process.env.CLIENT_DIR;
  await server.close();
  rmSync(folder, { recursive: true, force: true });
});

const get = (address: string, headers: Record<string, string> = {}) =>
  fetch(`${server.origin}${address}`, { headers });
const html = { accept: 'text/html,application/xhtml+xml,*/*;q=0.8' };

/** Sends bytes as they are, which a well-behaved client would not. */
function raw(request: string): Promise<string> {
  const { port } = new URL(server.origin);
  return new Promise((done, fail) => {
    const socket = connect(Number(port), '127.0.0.1', () => socket.write(request));
    let answer = '';
    socket.on('data', (data) => (answer += data.toString()));
    socket.on('close', () => done(answer));
    socket.on('error', fail);
    // Half a request is waited for longer than a test may take.
    socket.setTimeout(700, () => socket.destroy());
  });
}
const rawGet = async (target: string) =>
  (await raw(`GET ${target} HTTP/1.1\r\nHost: x\r\nAccept: text/html\r\nConnection: close\r\n\r\n`)).split(
    '\r\n',
  )[0];

describe('health', () => {
  test('it is alive and ready', async () => {
    const [alive, ready] = await Promise.all([get('/healthz'), get('/readyz')]);
    expect([alive.status, await alive.text()]).toEqual([200, 'alive']);
    expect([ready.status, await ready.text()]).toEqual([200, 'ready']);
  });
});

describe('an address that leads nowhere', () => {
  test.each([
    '/api',
    '/api/',
    '/api/v1',
    '/api/v1/nothing',
    '/api/v2/projects',
    '/API/v1/x',
    '/api/v1/Projects',
    '/api/v1/%E0%A4%A',
    '/api/..%2findex.html',
    '/api/v1/projects/%00',
  ])('%s under /api is a problem, never the page', async (address) => {
    const response = await get(address, { ...html, authorization: `Bearer ${person.token}` });
    expect(response.status).toBe(404);
    expect(response.headers.get('content-type')).toBe('application/problem+json; charset=utf-8');
    const body = problem.parse(await response.json());
    expect(body).toMatchObject({ status: 404, code: 'not-found' });
    expect(body.requestId).toMatch(/^[0-9a-f-]{36}$/);
  });

  test('another method at a known address is one too', async () => {
    const response = await fetch(`${server.origin}/api/v1/projects`, {
      method: 'DELETE',
      headers: { authorization: `Bearer ${person.token}` },
    });
    expect([response.status, (await response.json()).code]).toEqual([404, 'not-found']);
  });

  test.each(['/_expo/static/js/web/entry-old.js', '/_expo/', '/assets/gone.png', '/fonts/gone.ttf'])(
    '%s of the client is 404, not the page',
    async (address) => {
      const response = await get(address, html);
      expect(response.status).toBe(404);
      expect(await response.text()).not.toContain('<html');
    },
  );

  test('paths that lead out of the client’s folder lead nowhere', async () => {
    for (const target of [
      '/../../etc/passwd',
      '/..%2f..%2fetc/passwd',
      '/assets/..%2f..%2f..%2fetc%2fpasswd',
      '/_expo/../../package.json',
      '/_expo/..%5c..%5cpackage.json',
      '/_expo/%2e%2e/%2e%2e/package.json.js',
      '/.secret',
      '/%2esecret',
      '/assets/%00.js',
    ]) {
      const answer = await raw(`GET ${target} HTTP/1.1\r\nHost: x\r\nConnection: close\r\n\r\n`);
      expect([
        target,
        answer.includes('root:'),
        answer.includes('"dependencies"'),
        answer.includes('hidden'),
      ]).toEqual([target, false, false, false]);
      expect([target, answer.slice(9, 12)]).not.toEqual([target, '500']);
    }
  });
});

describe('the client', () => {
  test.each(['/', '/projects/x/residues/y/61', '/sign-in', '/apiary', '/socket.iox'])(
    '%s is the page, never kept',
    async (address) => {
      const response = await get(address, html);
      expect([response.status, await response.text()]).toEqual([200, page]);
      expect(response.headers.get('cache-control')).toBe('no-cache');
      expect(response.headers.get('content-type')).toBe('text/html; charset=utf-8');
    },
  );

  test('who does not ask for a page gets none', async () => {
    const response = await get('/projects/x', { accept: 'application/json' });
    expect([response.status, (await response.json()).code]).toEqual([404, 'not-found']);
  });

  test('its scripts are kept for good, and sent packed to who can unpack', async () => {
    const address = '/_expo/static/js/web/entry-1a2b.js';
    const packed = await get(address, { 'accept-encoding': 'gzip' });
    expect([packed.headers.get('content-encoding'), await packed.text()]).toEqual(['gzip', 'packed()']);
    const plain = await get(address, { 'accept-encoding': 'identity' });
    expect([plain.headers.get('content-encoding'), await plain.text()]).toEqual([null, 'plain()']);
    for (const { headers } of [packed, plain, await get('/assets/picture-3c.png')]) {
      expect(headers.get('cache-control')).toMatch(/max-age=31536000, immutable/);
    }
    expect(packed.headers.get('content-type')).toMatch(/javascript/);
  });
});

describe('headers', () => {
  test.each([
    ['the page', '/'],
    ['an answer', '/api/v1/projects'],
    ['a refusal', '/api/v1/nothing'],
    ['health', '/healthz'],
  ])('%s carries what keeps other sites and injected scripts out', async (_, address) => {
    const { headers } = await get(address, { ...html, authorization: `Bearer ${person.token}` });
    const policy = new Map(
      (headers.get('content-security-policy') ?? '').split(';').map((part) => {
        const [name = '', ...sources] = part.trim().split(' ');
        return [name, sources.join(' ')];
      }),
    );
    expect(policy.get('default-src')).toBe("'self'");
    expect(policy.get('script-src')).toBe("'self'");
    expect(policy.get('style-src')).toBe("'self' 'sha256-abc='");
    expect(policy.get('object-src')).toBe("'none'");
    expect(policy.get('base-uri')).toBe("'self'");
    expect(policy.get('frame-ancestors')).toBe("'none'");
    expect(headers.get('x-content-type-options')).toBe('nosniff');
    expect(headers.get('x-frame-options')).toBe('SAMEORIGIN');
    expect(headers.get('referrer-policy')).toBe('no-referrer');
    expect(headers.get('x-powered-by')).toBeNull();
    expect(headers.get('access-control-allow-origin')).toBeNull();
  });

  test('answers of the API are kept nowhere', async () => {
    const { headers } = await get('/api/v1/projects', { authorization: `Bearer ${person.token}` });
    expect(headers.get('cache-control')).toBe('no-store');
  });

  test('long answers are packed', async () => {
    for (let at = 0; at < 20; at += 1) await person.must(teams.make, { body: { name: `Team ${at}` } });
    const { port } = new URL(server.origin);
    const answer = await raw(
      `GET /api/v1/teams HTTP/1.1\r\nHost: 127.0.0.1:${port}\r\nAccept-Encoding: gzip\r\nAuthorization: Bearer ${person.token}\r\nConnection: close\r\n\r\n`,
    );
    expect(answer).toMatch(/content-encoding: gzip/i);
    const response = await get('/api/v1/teams', { authorization: `Bearer ${person.token}` });
    expect(await response.json()).toHaveLength(20);
  });
});

describe('bodies', () => {
  const send = (body: BodyInit, headers: Record<string, string> = {}, address = '/api/v1/teams') =>
    fetch(`${server.origin}${address}`, {
      method: 'POST',
      headers: { authorization: `Bearer ${person.token}`, 'content-type': 'application/json', ...headers },
      body,
    });

  test.each<[string, BodyInit, Record<string, string>, number]>([
    ['cut off', '{"name":"A te', {}, 400],
    ['no JSON', 'name=x', {}, 400],
    ['null', 'null', {}, 400],
    ['a list', '[]', {}, 400],
    ['a list of things', '[{"name":"x"}]', {}, 400],
    ['a number', '7', {}, 400],
    ['empty', '', {}, 400],
    ['a form instead', 'name=x', { 'content-type': 'application/x-www-form-urlencoded' }, 400],
    ['text instead', '{"name":"x"}', { 'content-type': 'text/plain' }, 400],
    ['of an odd character set', '{"name":"x"}', { 'content-type': 'application/json; charset=utf-99' }, 400],
    ['said to be packed', '{"name":"x"}', { 'content-encoding': 'gzip' }, 400],
    ['of an odd packing', '{"name":"x"}', { 'content-encoding': 'snappy' }, 400],
    ['a prototype', '{"name":"x","__proto__":{"isLead":true}}', {}, 400],
    ['a constructor', '{"name":"x","constructor":{"prototype":{"isLead":true}}}', {}, 400],
    ['nested without end', `{"name":${'['.repeat(20_000)}${']'.repeat(20_000)}}`, {}, 400],
    ['three megabytes', JSON.stringify({ name: 'x'.repeat(3_000_000) }), {}, 413],
    [
      'packed until it is small',
      gzipSync(JSON.stringify({ name: 'x'.repeat(50_000_000) })),
      { 'content-encoding': 'gzip' },
      413,
    ],
  ])('%s: refused in words', async (_, body, headers, status) => {
    const response = await send(body, headers);
    expect(response.status).toBe(status);
    expect(response.headers.get('content-type')).toMatch(/^application\/problem\+json/);
    const said = problem.parse(await response.json());
    expect(said.detail.length).toBeGreaterThan(10);
    expect(JSON.stringify(said)).not.toMatch(/node_modules|at .*\.ts|SyntaxError|Unexpected token/);
  });

  test('a packed body within the limit is read', async () => {
    const response = await send(gzipSync('{"name":"Packed"}'), { 'content-encoding': 'gzip' });
    expect(response.status).toBe(201);
  });

  test('a fault says nothing of what is inside, and has its number', async () => {
    const { container } = await Promise.resolve(server);
    const { projectService } = container;
    const failing = jest
      .spyOn(projectService, 'change')
      .mockRejectedValue(new Error('the inside of the server'));
    const params = { projectId: '00000000-0000-4000-8000-000000000000' };
    const answer = await person.ask(projects.change, {
      params,
      version: 1,
      body: { name: 'x', readersMayComment: false },
    });
    failing.mockRestore();
    expect([answer.status, answer.body.code]).toEqual([500, 'fault']);
    expect(JSON.stringify(answer.body)).not.toContain('inside');
    expect(answer.body.requestId).toMatch(/^[0-9a-f-]{36}$/);
  });

  test('odd requests below HTTP end no process', async () => {
    for (const request of [
      '\r\n\r\n',
      'x',
      'GET / HTTP/9.9\r\n\r\n',
      `GET /${'x'.repeat(100_000)} HTTP/1.1\r\n\r\n`,
      'POST /api/v1/teams HTTP/1.1\r\nContent-Length: -1\r\n\r\n',
      'POST /api/v1/teams HTTP/1.1\r\nHost: x\r\nTransfer-Encoding: chunked\r\nContent-Length: 5\r\n\r\nhello',
    ]) {
      await raw(request).catch(() => '');
    }
    expect(await rawGet('/healthz')).toBe('HTTP/1.1 200 OK');
  });
});
