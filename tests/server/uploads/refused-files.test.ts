import { existsSync, readdirSync, readFileSync, readlinkSync } from 'node:fs';
import { connect } from 'node:net';
import path from 'node:path';
import { alignments, families, projects, structures, uploads } from '@/shared/contracts';
import { makeProject, signUp, type TestPerson } from '../../support/person';
import { startTestServer, type TestServer } from '../../support/server';

jest.setTimeout(60_000);

let server: TestServer;
let lead: TestPerson;
let projectId: string;
let familyId: string;

beforeAll(async () => {
  server = await startTestServer();
  lead = await signUp(server);
  projectId = (await makeProject(lead)).id;
  familyId =
    (await lead.must(families.list, { params: { projectId } })).find(({ name }) => name === 'c')?.id ?? '';
});
afterAll(() => server.close());

const fixture = (name: string) => readFileSync(path.join(__dirname, '../../fixtures', name));
const text = (value: string) => new TextEncoder().encode(value);

/** How many rows each table holds that a file could have written to. */
async function rowsWritten(): Promise<Record<string, number>> {
  const tables = [
    'protein',
    'numbering',
    'alignment',
    'alignment_revision',
    'structure',
    'chain',
    'residue_map',
  ];
  const counts: Record<string, number> = {};
  for (const table of tables) {
    const [row]: { n: string }[] = await server.container.source.query(`SELECT COUNT(*) n FROM ${table}`);
    counts[table] = Number(row?.n);
  }
  return counts;
}

const cases: [string, 'alignment' | 'structure', () => Uint8Array, string][] = [
  ['rows of unequal length', 'alignment', () => text('>a\nACDEF\n>b\nACDE\n>c\nACD-F\n'), 'row-length'],
  ['letters that are none', 'alignment', () => text('>a\nACD1F\n>b\nAC@EF\n'), 'letter-unknown'],
  ['an empty file', 'alignment', () => text(''), 'file-empty'],
  [
    'a binary file',
    'alignment',
    () => Uint8Array.from({ length: 3000 }, (_, at) => (at * 7) % 256),
    'file-binary',
  ],
  [
    'coordinates in place of an alignment',
    'alignment',
    () => fixture('structures/4bem.pdb'),
    'wrong-kind-coordinates',
  ],
  [
    'an alignment that was cut short',
    'alignment',
    () => fixture('alignments/c_small_mafft.afa').subarray(0, 450),
    'row-length',
  ],
  ['an empty coordinate file', 'structure', () => text(''), 'empty'],
  [
    'a binary file of coordinates',
    'structure',
    () => Uint8Array.from({ length: 3000 }, (_, at) => at % 256),
    'binary',
  ],
  [
    'an alignment in place of coordinates',
    'structure',
    () => fixture('alignments/c_small_mafft.afa'),
    'wrong-kind',
  ],
  [
    'coordinates cut off before the first atom',
    'structure',
    () => fixture('structures/4bem.pdb').subarray(0, 4000),
    'no-atoms',
  ],
];

describe('a file that cannot be used', () => {
  it.each(cases)('%s (%s) says why and stores nothing but itself', async (_name, kind, bytes, code) => {
    const before = await rowsWritten();
    const fields: Record<string, string> = kind === 'alignment' ? { kind, familyId } : { kind };
    const { status, body } = await lead.upload(projectId, fields, 'file.txt', bytes());
    expect(status).toBe(201);
    const upload = await lead.settled(projectId, body.id);
    expect(upload).toMatchObject({ state: 'refused', alignmentId: null, structureId: null });
    expect(upload.issues.map((issue) => issue.code)).toContain(code);
    expect(upload.issues.every((issue) => issue.message.length > 10)).toBe(true);
    expect(await rowsWritten()).toEqual(before);
    expect(await lead.must(alignments.list, { params: { projectId } })).toEqual([]);
    expect(await lead.must(structures.list, { params: { projectId } })).toEqual([]);
    // The bytes are kept, and the refusal is told to everybody.
    expect((await lead.must(uploads.list, { params: { projectId } }))[0]?.id).toBe(upload.id);
    const { events } = await lead.must(projects.events, { params: { projectId }, query: { after: 0 } });
    expect(events.at(-1)).toMatchObject({
      kind: 'upload.changed',
      payload: { id: upload.id, state: 'refused' },
    });
  });

  it('shows the lines around a problem, cut and without what cannot be seen', async () => {
    const bytes = text(
      `>a\r\nACDEF\r\n>b\r\nAC\u0007\u202eDE${'F'.repeat(5000)}\r\n>c\r\nACDEF\r\n>d\r\nACDEF\r\n`,
    );
    const { body } = await lead.upload(projectId, { kind: 'alignment', familyId }, 'odd.afa', bytes);
    const params = { projectId, uploadId: body.id };
    const { firstLine, lines } = await lead.must(uploads.excerpt, { params, query: { line: 5 } });
    expect(firstLine).toBe(2);
    expect(lines.map((line) => line.slice(0, 8))).toEqual([
      'ACDEF',
      '>b',
      'AC··DEFF',
      '>c',
      'ACDEF',
      '>d',
      'ACDEF',
    ]);
    expect(lines[2]?.length).toBe(201);
    expect((await lead.must(uploads.excerpt, { params, query: { line: 900 } })).lines).toEqual([]);
  });

  it('keeps at most 200 of its problems', async () => {
    const rows = Array.from(
      { length: 400 },
      (_, at) => `>row${at}\n${'ACDEF'.repeat(2)}${'A'.repeat(at % 7)}1\n`,
    );
    const { body } = await lead.upload(
      projectId,
      { kind: 'alignment', familyId },
      'many.afa',
      text(rows.join('')),
    );
    const upload = await lead.settled(projectId, body.id);
    expect(upload.state).toBe('refused');
    expect(upload.issues.slice(0, -1)).toHaveLength(200);
    // Each row has a wrong letter, 343 of the 400 another length than most: 200 are listed.
    const last = upload.issues.at(-1);
    expect(last?.code).toBe('more-issues');
    expect(Number(/^(\d+) more problems/.exec(last?.message ?? '')?.[1])).toBeGreaterThanOrEqual(500);
  });
});

describe('the form of an upload', () => {
  const incoming = () => path.join(server.container.files.pathOf('0'.repeat(64)), '..', '..', 'incoming');
  /** Temporary files are removed when the reply has gone, so a moment after it has come. */
  const temporaryFiles = async () => {
    const there = () => (existsSync(incoming()) ? readdirSync(incoming()) : []);
    for (let tries = 0; tries < 40 && there().length > 0; tries += 1)
      await new Promise((done) => setTimeout(done, 25));
    return there();
  };
  const good = () => fixture('alignments/c_small_mafft.afa');

  it('must hold a file, and an alignment a family', async () => {
    const empty = new FormData();
    empty.append('kind', 'structure');
    const response = await fetch(`${server.origin}/api/v1/projects/${projectId}/uploads`, {
      method: 'POST',
      headers: { authorization: `Bearer ${lead.token}` },
      body: empty,
    });
    expect([response.status, ((await response.json()) as { code: string }).code]).toEqual([
      400,
      'file-missing',
    ]);
    const noFamily = await lead.upload(projectId, { kind: 'alignment' }, 'c.afa', good());
    expect(noFamily).toMatchObject({ status: 422, body: { code: 'family-needed' } });
    const other = await lead.upload(
      projectId,
      { kind: 'alignment', familyId: '018f0000-0000-7000-8000-000000000000' },
      'c.afa',
      good(),
    );
    expect(other.status).toBe(404);
    const strange = await lead.upload(projectId, { kind: 'picture', more: 'x' }, 'c.afa', good());
    expect(strange).toMatchObject({ status: 400, body: { code: 'bad-request' } });
    expect(await temporaryFiles()).toEqual([]);
  });

  it('gives back a harmless name of the file', async () => {
    const name = '../../etc/c su\u200ebunits\u202e.afa';
    const { body } = await lead.upload(projectId, { kind: 'alignment', familyId }, name, good());
    expect(body.fileName).toBe('c subunits.afa');
    const long = await lead.upload(
      projectId,
      { kind: 'alignment', familyId },
      `${'γ'.repeat(300)}.afa`,
      good(),
    );
    expect([...(long.body.fileName ?? '')].length).toBeLessThanOrEqual(255);
    expect(long.body.fileName).toMatch(/^γγγ.*γ\.afa$/);
  });

  it('that breaks off, or is none, is refused and leaves no file behind', async () => {
    const boundary = 'xxboundaryxx';
    const head = `--${boundary}\r\nContent-Disposition: form-data; name="file"; filename="a.afa"\r\n\r\n`;
    for (const body of [`${head}>a\r\nACD`, `--${boundary}`, 'no form at all']) {
      const response = await fetch(`${server.origin}/api/v1/projects/${projectId}/uploads`, {
        method: 'POST',
        headers: {
          authorization: `Bearer ${lead.token}`,
          'content-type': `multipart/form-data; boundary=${boundary}`,
        },
        body,
      });
      expect([response.status, ((await response.json()) as { code: string }).code]).toEqual([
        400,
        'bad-form',
      ]);
    }
    expect(await temporaryFiles()).toEqual([]);
  });
});

describe('a client that goes away in the middle of a file', () => {
  it('leaves no file and no open descriptor behind, however often', async () => {
    const folder = path.join(server.container.files.pathOf('0'.repeat(64)), '..', '..', 'incoming');
    const there = () => (existsSync(folder) ? readdirSync(folder) : []);
    const openFiles = () =>
      readdirSync('/proc/self/fd').flatMap((name) => {
        try {
          const target = readlinkSync(`/proc/self/fd/${name}`);
          return target.startsWith(folder) ? [target] : [];
        } catch {
          return [];
        }
      });
    const { port } = new URL(server.origin);
    const head = [
      `POST /api/v1/projects/${projectId}/uploads HTTP/1.1`,
      'Host: 127.0.0.1',
      `Authorization: Bearer ${lead.token}`,
      'Content-Type: multipart/form-data; boundary=xx',
      'Content-Length: 5000000',
      '',
      '--xx\r\nContent-Disposition: form-data; name="file"; filename="a.afa"\r\n\r\n',
    ].join('\r\n');
    let arrived = 0;
    for (let times = 0; times < 10; times += 1) {
      const socket = connect(Number(port), '127.0.0.1');
      socket.on('error', () => {});
      socket.write(head + 'A'.repeat(200_000));
      for (let tries = 0; tries < 100 && there().length === 0; tries += 1)
        await new Promise((done) => setTimeout(done, 5));
      arrived += there().length > 0 ? 1 : 0;
      socket.destroy();
      for (let tries = 0; tries < 100 && there().length > 0; tries += 1)
        await new Promise((done) => setTimeout(done, 20));
    }
    expect(arrived).toBe(10);
    expect(there()).toEqual([]);
    expect(openFiles()).toEqual([]);
  });
});

describe('a file over the limit', () => {
  it('is refused by its size, without keeping what came', async () => {
    const small = await startTestServer({ UPLOAD_LIMIT_MB: '1' });
    try {
      const person = await signUp(small);
      const { id } = await makeProject(person);
      const { status, body } = await person.upload(
        id,
        { kind: 'structure' },
        'big.pdb',
        new Uint8Array(1_500_000),
      );
      expect(status).toBe(413);
      expect(body.code).toBe('file-too-large');
      const folder = path.join(small.container.files.pathOf('0'.repeat(64)), '..', '..', 'incoming');
      expect(readdirSync(folder)).toEqual([]);
      expect(await person.must(uploads.list, { params: { projectId: id } })).toEqual([]);
    } finally {
      await small.close();
    }
  });
});
