// The server is killed while files are taken in and read and annotations are made: all or nothing, and nothing twice.
import { createHash, randomUUID } from 'node:crypto';
import { readFileSync, readdirSync, utimesSync } from 'node:fs';
import { connect } from 'node:net';
import path from 'node:path';
import { between, seeded } from '@/tests/support/random';
import { isFull, pause, report, until } from '@/tests/support/size';
import {
  eventsAfter,
  openWorkbench,
  shareProject,
  type SharedProject,
  type Workbench,
} from './support/workbench';
import { alignments, annotations, families, structures, uploads } from '@/shared/contracts';

const seed = 20260402;
const kills = isFull ? 20 : 4;
const random = seeded(seed);
const fixtures = path.join(__dirname, '../fixtures');

/** Rows of alignments, and chains as tests/fixtures/expected/structures lists them. */
const files = [
  { file: 'alignments/gamma_small_mafft.afa', kind: 'alignment', family: 'γ', rows: 3 },
  { file: 'alignments/c_small_mafft.afa', kind: 'alignment', family: 'c', rows: 5 },
  { file: 'structures/4bem.pdb', kind: 'structure', family: '', rows: 0 },
  { file: 'alignments/delta_mafft.afa', kind: 'alignment', family: 'δ', rows: 7 },
] as const;

let bench: Workbench;
let project: SharedProject;
beforeAll(async () => {
  bench = await openWorkbench({ JOB_LEASE_SECONDS: '2' });
  project = await shareProject(bench.server);
});
afterAll(() => bench.close());

interface Answer {
  status: number;
  body: { id?: string };
}

/** As a client does: the same act under the same key until the server took it. */
async function insist(act: (key: string) => Promise<Answer>, key: string): Promise<string> {
  for (;;) {
    const answer = await act(key).catch(() => null);
    if (answer?.status === 201) return answer.body.id ?? '';
    if (answer && answer.status !== 503) throw new Error(`Refused: ${JSON.stringify(answer)}`);
    await pause(50);
  }
}

test(`${kills} kills while files are read and pins are set`, async () => {
  report(`seed ${seed}`);
  const { projectId, lead, contributor, proteinId } = project;
  const list = await lead.must(families.list, { params: { projectId } });
  const familyOf = (name: string) => list.find((family) => family.name === name)?.id ?? '';
  const uploaded: { id: string; file: (typeof files)[number] }[] = [];
  const pinned = new Map<string, string>();
  let going = true;

  const upload = async () => {
    for (let number = 0; going || number < files.length; number += 1) {
      const file = files[number % files.length];
      if (!file) return;
      const bytes = readFileSync(path.join(fixtures, file.file));
      const fields = {
        kind: file.kind,
        name: `upload ${number}`,
        ...(file.family && { familyId: familyOf(file.family) }),
      };
      const send = (key: string) => lead.upload(projectId, fields, path.basename(file.file), bytes, key);
      uploaded.push({ id: await insist(send, randomUUID()), file });
      await pause(between(random, 0, isFull ? 700 : 250));
    }
  };
  const annotate = async () => {
    for (let number = 0; going; number += 1) {
      const text = `What is known, ${number}.`;
      const body = {
        pins: [0, 1].map((at) => ({ proteinId, residueIndex: (number + at) % 70 })),
        kind: 'note' as const,
        text,
        confidence: 'low' as const,
        evidence: [],
      };
      const send = (key: string) => contributor.ask(annotations.make, { params: { projectId }, body, key });
      pinned.set(await insist(send, randomUUID()), text);
      await pause(between(random, 5, 60));
    }
  };
  const kill = async () => {
    for (let count = 0; count < kills; count += 1) {
      await pause(between(random, 100, isFull ? 2500 : 1200));
      await bench.server.kill();
      await bench.server.restart();
    }
    going = false;
  };
  await Promise.all([upload(), annotate(), kill()]);

  const waited = await until(
    'every file is read, by whichever server',
    async () =>
      (await bench.rows("SELECT id FROM upload WHERE state IN ('received', 'reading')")).length === 0,
    60_000,
  );
  const taken = await bench.rows<{ attempts: number }>('SELECT attempts FROM job');
  report(
    `${uploaded.length} files and ${pinned.size} annotations acknowledged over ${kills} kills; ` +
      `${taken.filter(({ attempts }) => attempts > 1).length} files taken up again, at most ${Math.max(...taken.map(({ attempts }) => attempts))} times; ` +
      `last one read ${waited} ms after the last kill`,
  );

  // Acknowledged is there, nothing is there twice, nothing is there that was not acknowledged.
  const rows = await lead.must(uploads.list, { params: { projectId } });
  const ofSetUp = rows.filter(({ id }) => !uploaded.some((one) => one.id === id));
  expect(ofSetUp.map(({ fileName }) => fileName)).toEqual(['c_small_mafft.afa']);
  expect(new Set(uploaded.map(({ id }) => id)).size).toBe(uploaded.length);
  expect(rows.map(({ state }) => state).filter((state) => state === 'refused')).toEqual([]);
  const allAlignments = await lead.must(alignments.list, { params: { projectId } });
  const allStructures = await lead.must(structures.list, { params: { projectId } });
  expect(allAlignments.map(({ id }) => id).sort()).toEqual(
    rows.flatMap((row) => row.alignmentId ?? []).sort(),
  );
  expect(allStructures.map(({ id }) => id).sort()).toEqual(
    rows.flatMap((row) => row.structureId ?? []).sort(),
  );
  const chains = expectedChains('4bem.pdb');
  for (const { id, file } of uploaded) {
    const row = rows.find((one) => one.id === id);
    if (file.kind === 'alignment') {
      const read = await lead.must(alignments.read, {
        params: { projectId, alignmentId: row?.alignmentId ?? '' },
      });
      expect(read.rows).toHaveLength(file.rows);
      expect(read.rows.every(({ text }) => text.length === read.columnCount)).toBe(true);
    } else {
      const params = { projectId, structureId: row?.structureId ?? '' };
      const read = await lead.must(structures.read, { params });
      expect(read.chains.map(({ authorId }) => authorId)).toEqual(chains);
    }
  }
  // Rows that nothing points to would be half of something.
  for (const [table, parent] of [
    ['alignment_revision', 'SELECT current_revision_id FROM alignment'],
    ['structure_revision', 'SELECT current_revision_id FROM structure'],
  ] as const) {
    expect(await bench.rows(`SELECT id FROM ${table} WHERE id NOT IN (${parent})`)).toEqual([]);
  }
  // The same file again brings no protein twice.
  const twice =
    'SELECT family_id FROM protein GROUP BY family_id, organism, residues_hash HAVING COUNT(*) > 1';
  expect(await bench.rows(twice)).toEqual([]);

  const made = await bench.rows<{ id: string }>('SELECT id FROM annotation');
  expect(made.map(({ id }) => id).sort()).toEqual([...pinned.keys()].sort());
  const texts = await bench.rows<{ annotation_id: string; text: string }>(
    'SELECT annotation_id, text FROM annotation_version',
  );
  expect(new Map(texts.map((row) => [row.annotation_id, row.text]))).toEqual(pinned);
  expect(texts).toHaveLength(pinned.size);
  const pins = await bench.rows<{ pins: number }>('SELECT COUNT(*) pins FROM pin GROUP BY annotation_id');
  expect(pins.map((row) => Number(row.pins))).toEqual(made.map(() => 2));
  const audited = await bench.rows<{ subject_id: string }>(
    "SELECT subject_id FROM audit_entry WHERE subject_kind = 'annotation'",
  );
  expect(audited.map((row) => row.subject_id).sort()).toEqual([...pinned.keys()].sort());

  const events = await eventsAfter(lead, projectId, 0);
  expect(events.map(({ eventNumber }) => eventNumber)).toEqual(events.map((_, at) => at + 1));
  expect(events.filter(({ kind }) => kind === 'annotation.changed').length).toBe(pinned.size);
});

test('every stored file is whole, and what a kill left half received is swept by the next server', async () => {
  const stored = await bench.rows<{ hash: string; bytes: string }>('SELECT hash, bytes FROM stored_file');
  expect(stored.length).toBeGreaterThanOrEqual(new Set(files.map(({ file }) => file)).size);
  for (const { hash, bytes } of stored) {
    const content = readFileSync(path.join(bench.dataDir, 'files', hash.slice(0, 2), hash.slice(2)));
    expect(content.length).toBe(Number(bytes));
    expect(createHash('sha256').update(content).digest('hex')).toBe(hash);
  }

  const { projectId, lead } = project;
  const incoming = path.join(bench.dataDir, 'files', 'incoming');
  const before = new Set(readdirSync(incoming));
  const half = connect(bench.server.port, '127.0.0.1');
  half.on('error', () => {});
  const lines = [
    `POST /api/v1/projects/${projectId}/uploads HTTP/1.1`,
    'Host: 127.0.0.1',
    `Authorization: Bearer ${lead.token}`,
    'Content-Type: multipart/form-data; boundary=xx',
    'Content-Length: 5000000',
    '',
    '--xx\r\nContent-Disposition: form-data; name="file"; filename="a.pdb"\r\n\r\n',
  ];
  half.write(lines.join('\r\n') + 'A'.repeat(200_000));
  const arrived = () => readdirSync(incoming).filter((name) => !before.has(name));
  await until('a file is half received', () => arrived().length === 1, 5000);
  await bench.server.kill();
  half.destroy();
  expect(arrived()).toHaveLength(1);
  const hoursAgo = Date.now() / 1000 - 2 * 3600;
  for (const name of readdirSync(incoming)) utimesSync(path.join(incoming, name), hoursAgo, hoursAgo);
  await bench.server.restart();
  expect(readdirSync(incoming)).toEqual([]);
});

/** Chains of the file as an outside program lists them (tests/fixtures/expected, Biopython). */
function expectedChains(name: string): string[] {
  const file = path.join(fixtures, 'expected/structures', `${name}.json`);
  const { chains } = JSON.parse(readFileSync(file, 'utf8')) as { chains: { id: string }[] };
  return chains.map(({ id }) => id);
}
