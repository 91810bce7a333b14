// Files that bring a reader down and uploads that break off leave the server as it was.
import { readdirSync, readFileSync } from 'node:fs';
import { connect } from 'node:net';
import path from 'node:path';
import { between, seeded } from '@/tests/support/random';
import { isFull, pause, report, until } from '@/tests/support/size';
import { openWorkbench, shareProject, type SharedProject, type Workbench } from './support/workbench';
import { alignments, families, uploads } from '@/shared/contracts';

const seed = 20260403;
const cutOffs = isFull ? 200 : 30;
const random = seeded(seed);

let bench: Workbench;
let project: SharedProject;
beforeAll(async () => {
  bench = await openWorkbench({ WORKER_MEMORY_MB: '64' });
  project = await shareProject(bench.server);
});
afterAll(() => bench.close());

const openDescriptors = () => readdirSync(`/proc/${bench.server.pid}/fd`).length;
const incoming = () => readdirSync(path.join(bench.dataDir, 'files', 'incoming'));

test('a file that takes more memory than its reader may have is refused with words; the server reads the next', async () => {
  const { projectId, lead, familyId } = project;
  const pid = bench.server.pid;
  const row = (at: number) => `>row${at}\n${'ACDEFGHIKLMNPQRSTVWY'.repeat(100)}\n`;
  const large = Buffer.from(Array.from({ length: 25_000 }, (_, at) => row(at)).join(''));
  const before = await lead.must(alignments.list, { params: { projectId } });
  const proteins = await lead.must(families.proteins, { params: { projectId, familyId } });

  const began = Date.now();
  const sent = await lead.upload(projectId, { kind: 'alignment', familyId }, 'large.afa', large);
  expect(sent.status).toBe(201);
  const refused = await lead.settled(projectId, sent.body.id);
  report(`${Math.round(large.length / 1e6)} MB in a reader of 64 MB: refused after ${Date.now() - began} ms`);
  expect(refused).toMatchObject({
    state: 'refused',
    alignmentId: null,
    issues: [{ code: 'too-much-memory', severity: 'error' }],
  });
  // Nothing of it was written.
  expect(await lead.must(alignments.list, { params: { projectId } })).toEqual(before);
  expect(await lead.must(families.proteins, { params: { projectId, familyId } })).toEqual(proteins);

  const list = await lead.must(families.list, { params: { projectId } });
  const gamma = list.find(({ name }) => name === 'γ')?.id ?? '';
  const next = await lead.uploadFixture(
    projectId,
    { kind: 'alignment', familyId: gamma },
    'alignments/gamma_small_mafft.afa',
  );
  expect(next).toMatchObject({ state: 'done', issues: [] });
  expect(bench.server.pid).toBe(pid);
});

test(`${cutOffs} uploads cut off on the way leave no row, no temporary file and no open descriptor`, async () => {
  report(`seed ${seed}`);
  const { projectId, lead } = project;
  const rowsBefore = (await lead.must(uploads.list, { params: { projectId } })).length;
  const content = readFileSync(path.join(__dirname, '../fixtures/structures/4bem.pdb'));
  const head = Buffer.from(
    '--xx\r\nContent-Disposition: form-data; name="kind"\r\n\r\nstructure\r\n' +
      '--xx\r\nContent-Disposition: form-data; name="file"; filename="ring.pdb"\r\n\r\n',
  );
  const body = Buffer.concat([head, content, Buffer.from('\r\n--xx--\r\n')]);
  const lines = [
    `POST /api/v1/projects/${projectId}/uploads HTTP/1.1`,
    'Host: 127.0.0.1',
    `Authorization: Bearer ${lead.token}`,
    'Content-Type: multipart/form-data; boundary=xx',
    `Content-Length: ${body.length}`,
    '\r\n',
  ].join('\r\n');

  let mostAtOnce = 0;
  const cutOff = async () => {
    const socket = connect(bench.server.port, '127.0.0.1');
    socket.on('error', () => {});
    socket.write(lines);
    // Anywhere: in a header of a part, in the file, just before its end; in one piece or in many.
    const upTo = random() < 0.3 ? between(random, 0, head.length) : between(random, 0, body.length - 9);
    for (let at = 0; at < upTo;) {
      const piece = Math.min(upTo - at, between(random, 1, 200_000));
      socket.write(body.subarray(at, at + piece));
      at += piece;
      if (random() < 0.5) await pause(between(random, 0, 10));
    }
    await pause(between(random, 0, 30));
    mostAtOnce = Math.max(mostAtOnce, incoming().length);
    socket.destroy();
  };

  await cutOff();
  await until('the first is forgotten', () => incoming().length === 0, 5000);
  const descriptorsBefore = openDescriptors();
  for (let done = 0; done < cutOffs; done += 5) {
    await Promise.all(Array.from({ length: 5 }, cutOff));
  }
  const cleared = await until('no temporary file is left', () => incoming().length === 0, 5000);
  await until('descriptors are closed', () => openDescriptors() <= descriptorsBefore + 2, 5000);
  report(
    `${cutOffs} cut off; ${mostAtOnce} half received at once, all gone ${cleared} ms after the last; ` +
      `descriptors ${descriptorsBefore} before, ${openDescriptors()} after`,
  );
  expect(mostAtOnce).toBeGreaterThan(0);
  expect(await lead.must(uploads.list, { params: { projectId } })).toHaveLength(rowsBefore);
  // The server takes a whole one as ever.
  const whole = await lead.uploadFixture(projectId, { kind: 'structure' }, 'structures/4bem.pdb');
  expect(['waiting', 'done']).toContain(whole.state);
});
