import { randomUUID } from 'node:crypto';
import { readFileSync } from 'node:fs';
import path from 'node:path';
import { alignments, families, uploads } from '@/shared/contracts';
import { addMember, makeProject, signUp, type TestPerson } from '../../support/person';
import { startTestServer, type TestServer } from '../../support/server';

jest.setTimeout(60_000);

let server: TestServer;
let lead: TestPerson;
let projectId: string;
let fields: { kind: 'alignment'; familyId: string };
const bytes = readFileSync(path.join(__dirname, '../../fixtures/alignments/c_small_mafft.afa'));

beforeAll(async () => {
  server = await startTestServer();
  lead = await signUp(server);
  projectId = (await makeProject(lead)).id;
  const list = await lead.must(families.list, { params: { projectId } });
  fields = { kind: 'alignment', familyId: list.find(({ name }) => name === 'c')?.id ?? '' };
});
afterAll(() => server.close());

const listed = () => lead.must(uploads.list, { params: { projectId } });

describe('an upload sent again', () => {
  it('under the same key is the same upload, also when both are sent at once', async () => {
    const key = randomUUID();
    const [one, other] = await Promise.all([
      lead.upload(projectId, fields, 'c.afa', bytes, key),
      lead.upload(projectId, fields, 'c.afa', bytes, key),
    ]);
    const later = await lead.upload(projectId, fields, 'c.afa', bytes, key);
    expect([one.status, other.status, later.status]).toEqual([201, 201, 201]);
    expect(other.body.id).toBe(one.body.id);
    expect(later.body).toEqual(one.body);
    await lead.settled(projectId, one.body.id);
    expect(await listed()).toHaveLength(1);
    expect(await lead.must(alignments.list, { params: { projectId } })).toHaveLength(1);
  });

  it('under the same key with another file is refused', async () => {
    const key = randomUUID();
    const before = (await listed()).length;
    await lead.upload(projectId, fields, 'c.afa', bytes, key);
    const other = await lead.upload(projectId, fields, 'c.afa', bytes.subarray(0, 200), key);
    expect(other).toMatchObject({ status: 409, body: { code: 'key-reused' } });
    expect(await listed()).toHaveLength(before + 1);
  });

  it('under another key is an upload of its own of the same bytes and the same proteins', async () => {
    const { body } = await lead.upload(projectId, fields, 'c.afa', bytes, randomUUID());
    await lead.settled(projectId, body.id);
    const [files]: { n: string }[] = await server.container.source.query(
      'SELECT COUNT(*) n FROM stored_file',
    );
    expect(Number(files?.n)).toBe(1);
    const proteins = await lead.must(families.proteins, { params: { projectId, familyId: fields.familyId } });
    expect(proteins).toHaveLength(5);
  });
});

describe('who may upload', () => {
  it.each([
    ['reader', 403],
    ['contributor', 403],
    ['curator', 201],
    ['lead', 201],
  ] as const)('%s: %i', async (role, expected) => {
    const person = await addMember(lead, projectId, role);
    const { status } = await person.upload(projectId, fields, 'c.afa', bytes);
    expect(status).toBe(expected);
  });

  it('nobody from outside, who is told nothing of the project either', async () => {
    const stranger = await signUp(server);
    expect((await stranger.upload(projectId, fields, 'c.afa', bytes)).status).toBe(404);
    const uploadId = (await listed())[0]?.id ?? '';
    for (const answer of [
      await stranger.ask(uploads.read, { params: { projectId, uploadId } }),
      await stranger.ask(uploads.excerpt, { params: { projectId, uploadId }, query: { line: 1 } }),
    ])
      expect(answer.status).toBe(404);
    // Nor through a project of one's own.
    const own = await makeProject(stranger);
    const answer = await stranger.ask(uploads.read, { params: { projectId: own.id, uploadId } });
    expect(answer.status).toBe(404);
  });
});
