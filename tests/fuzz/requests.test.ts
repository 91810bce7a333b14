// Random requests to every endpoint there is: never a fault of the server, always an answer in the agreed form.
import { randomUUID } from 'node:crypto';
import { readFileSync } from 'node:fs';
import path from 'node:path';
import { z } from 'zod';
import { problem, uploads, type Endpoint } from '@/shared/contracts';
import { stageFull, type Full } from '@/tests/support/access-stage';
import { between, pick, seeded } from '@/tests/support/random';
import { startTestServer, type TestServer } from '@/tests/support/server';
import { isFull, report } from '@/tests/support/size';
import { mutateBytes } from './support/mutate-bytes';
import { anything, nearly, type Shape } from './support/random-input';

const seed = Number(process.env.FUZZ_SEED ?? 20260405);
const each = isFull ? 200 : 14;
const atOnce = 7;
const hangsAfterMilliseconds = 2000;
const patienceMilliseconds = 1_800_000;
/** Hashing a password takes its time on purpose. */
const slowOnPurpose = new Set(['auth.signUp', 'auth.signIn']);

let server: TestServer;
let full: Full;
let ids: string[];
beforeAll(async () => {
  server = await startTestServer();
  full = await stageFull(server);
  const { stage, structure } = full;
  ids = [
    full.projectId,
    stage.project.teamId,
    stage.familyId,
    stage.alignmentId,
    stage.alignmentUpload.id,
    stage.lead.id,
    stage.protein('ATPE_ECOLI').id,
    stage.protein('ATPE_VIBCH').id,
    structure.structureId,
    structure.upload.id,
    full.chainId,
    full.annotation.id,
    full.construct.id,
    full.mutant.id,
    randomUUID(),
  ];
});
afterAll(() => server.close());

const random = seeded(seed);
const shapeOf = (schema: z.ZodType) =>
  z.toJSONSchema(schema, { unrepresentable: 'any', io: 'input' }) as Shape;

/** The ids that belong where the address names them, so that most requests get past the door. */
function fitting(name: string): string {
  const known: Record<string, string> = {
    projectId: full.projectId,
    teamId: full.stage.project.teamId,
    familyId: full.stage.familyId,
    proteinId: full.stage.protein('ATPE_VIBCH').id,
    alignmentId: full.stage.alignmentId,
    structureId: full.structure.structureId,
    uploadId: full.structure.upload.id,
    chainId: full.chainId,
    annotationId: full.annotation.id,
    constructId: full.construct.id,
    mutantId: full.mutant.id,
    // Nobody is put out, or there would be nothing left to ask for.
    personId: randomUUID(),
    residueIndex: String(between(random, 0, 70)),
    subjectKey: `residue:${full.stage.protein('ATPE_VIBCH').id}:60`,
  };
  return known[name] ?? randomUUID();
}

/** In bodies and queries: mostly the one that fits, else one of something else. */
const idFor = (name: string) => (random() < 0.8 ? fitting(name) : pick(random, ids));

/** Some requests are almost right, some hardly. */
const howWild = () => ({ idFor, wild: pick(random, [0, 0.005, 0.02, 0.1]) });

const textOf = (value: unknown) => (typeof value === 'string' ? value : JSON.stringify(value)).slice(0, 3000);

function addressOf(endpoint: Endpoint): string {
  const at = endpoint.path.replace(/:(\w+)/g, (_, name: string) => {
    if (name === 'projectId' || random() < 0.9) return fitting(name);
    return encodeURIComponent(textOf(random() < 0.5 ? pick(random, ids) : anything(random)).toWellFormed());
  });
  const query = Object.entries(shapeOf(endpoint.query).properties ?? {})
    .filter(() => random() < 0.8)
    .map(
      ([name, shape]) =>
        `${name}=${encodeURIComponent(textOf(nearly(random, shape, howWild(), name)).toWellFormed())}`,
    );
  if (random() < 0.05) query.push('a=1&a=2', '__proto__=1', '%', 'x[]=1');
  return `${server.origin}/api/v1${at}${query.length > 0 ? `?${query.join('&')}` : ''}`;
}

function bodyOf(endpoint: Endpoint): Buffer {
  const value = random() < 0.85 ? nearly(random, shapeOf(endpoint.body), howWild()) : anything(random);
  const bytes = Buffer.from(JSON.stringify(value));
  return random() < 0.9 ? bytes : mutateBytes(random, bytes.length > 0 ? bytes : Buffer.from('{}'));
}

function headersOf(endpoint: Endpoint): Record<string, string> {
  return {
    ...(random() < 0.97 && { authorization: `Bearer ${full.stage.lead.token}` }),
    'content-type':
      random() < 0.95
        ? 'application/json'
        : pick(random, ['text/plain', 'application/json; charset=utf-7', 'multipart/form-data']),
    ...((endpoint.versioned || random() < 0.05) && {
      'if-match':
        random() < 0.8 ? `"${between(random, 1, 8)}"` : pick(random, ['*', '"x"', '99999999999', '"-1"']),
    }),
    ...(random() < 0.3 && {
      'idempotency-key': random() < 0.8 ? pick(random, [randomUUID(), ids[0] ?? '']) : 'no uuid',
    }),
  };
}

function requestTo(endpoint: Endpoint) {
  const address = addressOf(endpoint);
  const headers = headersOf(endpoint);
  const body = endpoint.method === 'GET' ? undefined : bodyOf(endpoint);
  return {
    address,
    init: { method: endpoint.method, headers, ...(body && { body: new Uint8Array(body) }) },
    sent: `${endpoint.method} ${address} ${JSON.stringify(headers)} ${body?.toString() ?? ''}`,
  };
}

async function judge(name: string, sent: string, ask: () => Promise<Response>): Promise<number> {
  const began = performance.now();
  const response = await ask();
  const text = await response.text();
  const took = performance.now() - began;
  const answer = { name, sent: sent.slice(0, 1500), status: response.status, text: text.slice(0, 400) };
  if (response.status >= 500) throw new Error(`seed ${seed}: ${JSON.stringify(answer, null, 1)}`);
  if (response.status >= 400) {
    expect(response.headers.get('content-type')).toMatch('application/problem+json');
    const read = problem.safeParse(JSON.parse(text));
    expect({ ...answer, ok: read.success }).toEqual({ ...answer, ok: true });
    expect(read.data?.status).toBe(response.status);
  }
  expect({ ...answer, isSlow: took > hangsAfterMilliseconds }).toEqual({ ...answer, isSlow: false });
  return response.status;
}

test(
  'every endpoint, with bodies, queries, ids and headers of every kind',
  async () => {
    const statuses = new Map<number, number>();
    let asked = 0;
    const began = Date.now();
    const faults: string[] = [];
    for (const { endpoint } of server.container.routes.registered) {
      if (endpoint.name === uploads.make.name) continue; // a form: below
      const count = slowOnPurpose.has(endpoint.name) ? Math.ceil(each / 5) : each;
      const requests = Array.from({ length: count }, () => requestTo(endpoint));
      let done = 0;
      const send = async ({ address, init, sent }: (typeof requests)[number]) => {
        try {
          const status = await judge(endpoint.name, sent, () => fetch(address, init));
          statuses.set(status, (statuses.get(status) ?? 0) + 1);
          if (status < 300) done += 1;
        } catch (error) {
          faults.push(error instanceof Error ? error.message : String(error));
        }
      };
      for (let at = 0; at < count; at += atOnce) await Promise.all(requests.slice(at, at + atOnce).map(send));
      asked += count;
      if (process.env.FUZZ_VERBOSE) report(`${endpoint.name}: ${done} of ${count} done`);
    }
    const list = [...statuses]
      .sort(([one], [other]) => one - other)
      .map(([status, many]) => `${status}: ${many}`);
    report(`${asked} requests in ${Date.now() - began} ms, seed ${seed}; ${list.join(', ')}`);
    expect(faults).toEqual([]);
    // Not only the door was knocked at.
    expect(statuses.get(200) ?? 0).toBeGreaterThan(asked / 10);
    expect(statuses.get(201) ?? 0).toBeGreaterThan(0);
  },
  patienceMilliseconds,
);

test('forms with bytes changed', async () => {
  const file = readFileSync(path.join(__dirname, '../fixtures/alignments/c_small_mafft.afa'));
  const field = (name: string, value: string) =>
    `--xx\r\nContent-Disposition: form-data; name="${name}"\r\n\r\n${value}\r\n`;
  const form = Buffer.concat([
    Buffer.from(field('kind', 'alignment') + field('familyId', full.stage.familyId)),
    Buffer.from(
      '--xx\r\nContent-Disposition: form-data; name="file"; filename="c.afa"\r\nContent-Type: text/plain\r\n\r\n',
    ),
    file,
    Buffer.from('\r\n--xx--\r\n'),
  ]);
  const began = Date.now();
  const count = each * 6;
  const answers = new Map<number, number>();
  for (let at = 0; at < count; at += 1) {
    const body = mutateBytes(random, random() < 0.5 ? form : form.subarray(0, 400));
    const type =
      random() < 0.95
        ? 'multipart/form-data; boundary=xx'
        : pick(random, [
            'multipart/form-data',
            'multipart/form-data; boundary=',
            'multipart/mixed; boundary=xx',
            `multipart/form-data; boundary=${'x'.repeat(200)}`,
          ]);
    const status = await judge('uploads.make', body.toString('latin1'), () =>
      fetch(`${server.origin}/api/v1/projects/${full.projectId}/uploads`, {
        method: 'POST',
        headers: { authorization: `Bearer ${full.stage.lead.token}`, 'content-type': type },
        body: new Uint8Array(body),
      }),
    );
    answers.set(status, (answers.get(status) ?? 0) + 1);
  }
  report(
    `${count} forms in ${Date.now() - began} ms; ${[...answers].map(([status, many]) => `${status}: ${many}`).join(', ')}`,
  );
  expect(answers.get(201) ?? 0).toBeGreaterThan(0);
  expect(answers.get(400) ?? 0).toBeGreaterThan(0);
});
