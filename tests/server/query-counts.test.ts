// How many statements a read takes does not depend on how much there is to show.
import { randomUUID } from 'node:crypto';
import {
  alignments,
  annotations,
  audit,
  families,
  plans,
  projects,
  residues,
  structures,
  threads,
  uploads,
  type Endpoint,
} from '@/shared/contracts';
import { askAny, type Full } from '@/tests/support/access-stage';
import { countQueries } from '@/tests/support/count-queries';
import { addMember, makeProject } from '@/tests/support/person';
import { startTestServer, type TestServer } from '@/tests/support/server';
import { pinAt, stageAlignment, stageConstruct, stageStructure, type Stage } from '@/tests/support/stage';

let server: TestServer;
let stage: Stage;
let construct: Full['construct'];

beforeAll(async () => {
  server = await startTestServer();
  stage = await stageAlignment(server);
  construct = await stageConstruct(stage);
  await fill(1);
});
afterAll(() => server.close());

const of = <More extends object>(more = {} as More) => ({ params: { projectId: stage.projectId, ...more } });
const carboxylate = () => ({ proteinId: stage.protein('ATPE2_ACEWO_4BEM').id, residueIndex: 61 });

/** Puts `times` of everything into the project, at the residues that are read. */
async function fill(times: number): Promise<void> {
  const { lead, projectId } = stage;
  for (let at = 0; at < times; at += 1) {
    for (const row of ['ATPE2_ACEWO_4BEM', 'ATPE_ECOLI'] as const) {
      const { id, version } = await pinAt(stage, row, row === 'ATPE_ECOLI' ? 60 : 61)(lead);
      const content = { kind: 'note' as const, text: 'Again.', confidence: 'low' as const, evidence: [] };
      await lead.must(annotations.edit, { ...of({ annotationId: id }), version, body: content });
      for (const subject of [
        { kind: 'residue' as const, ...carboxylate(), residueIndex: Math.floor(Math.random() * 80) },
        { kind: 'annotation' as const, id },
      ]) {
        await lead.must(threads.post, { ...of(), body: { clientKey: randomUUID(), subject, text: 'Seen.' } });
      }
    }
    await lead.must(threads.post, {
      ...of(),
      body: { clientKey: randomUUID(), subject: { kind: 'residue', ...carboxylate() }, text: 'Seen.' },
    });
    const planned = await lead.must(plans.makeMutant, {
      ...of(),
      body: {
        proteinId: stage.protein('ATPE_VIBCH').id,
        changes: 'D60N',
        constructId: construct.id,
        reason: '',
      },
    });
    await lead.must(plans.design, {
      ...of({ mutantId: planned.id }),
      version: planned.version,
      body: { constructId: construct.id, host: 'ecoli' },
    });
    const subject = { kind: 'mutant' as const, id: planned.id };
    await lead.must(threads.post, { ...of(), body: { clientKey: randomUUID(), subject, text: 'Order it?' } });
    await addMember(lead, projectId, 'reader');
    await makeProject(lead);
    await stageStructure(stage, 'structures/4bem.pdb');
  }
}

const reads: [string, Endpoint, () => object][] = [
  ['the passport', residues.passport, () => of(carboxylate())],
  ['the locator', residues.locate, () => ({ ...of(), query: { text: 'A:62' } })],
  ['the locator, by number', residues.locate, () => ({ ...of(), query: { text: '62' } })],
  ['threads', threads.list, () => of()],
  ['a thread', threads.ofSubject, () => of({ subjectKey: `residue:${carboxylate().proteinId}:61` })],
  ['annotations', annotations.list, () => of()],
  ['annotations at a residue', annotations.atResidue, () => of(carboxylate())],
  ['mutants', plans.mutants, () => of()],
  ['constructs', plans.constructs, () => of()],
  ['the primer list', plans.primerList, () => of()],
  ['projects', projects.list, () => ({})],
  ['members', projects.members, () => of()],
  ['events', projects.events, () => ({ ...of(), query: { after: 0 } })],
  ['audit', audit.list, () => of()],
  ['families', families.list, () => of()],
  ['proteins', families.proteins, () => of({ familyId: stage.familyId })],
  ['alignments', alignments.list, () => of()],
  ['structures', structures.list, () => of()],
  ['uploads', uploads.list, () => of()],
];

async function counts(): Promise<Map<string, { statements: number; size: number }>> {
  const found = new Map<string, { statements: number; size: number }>();
  for (const [name, endpoint, input] of reads) {
    const ask = () => askAny(server.origin, stage.lead.token, endpoint, input());
    // The sign-in is looked up once a second; it is known when the read is counted.
    await ask();
    let size = 0;
    const statements = await countQueries(server.container.source, async () => {
      const answer = await ask();
      expect([name, answer.status]).toEqual([name, 200]);
      size = JSON.stringify(answer.body).length;
    });
    found.set(name, { statements: statements.length, size });
  }
  return found;
}

test('every list and page is read in as many statements when there is several times as much', async () => {
  const few = await counts();
  await fill(2);
  const many = await counts();
  const table = (of_: typeof few) =>
    Object.fromEntries([...of_].map(([name, { statements }]) => [name, statements]));
  expect(table(many)).toEqual(table(few));
  // All but what stays as it was has grown.
  const same = ['families', 'proteins', 'alignments', 'constructs', 'the locator', 'the locator, by number'];
  for (const [name, { size }] of many) {
    if (!same.includes(name)) expect([name, size > (few.get(name)?.size ?? 0)]).toEqual([name, true]);
  }
  for (const [name, { statements }] of many) expect([name, statements <= 40]).toEqual([name, true]);
});

test('a passport and the locator take as many statements in a family of 60 rows as in one of 5', async () => {
  const { lead } = stage;
  const wide = await makeProject(lead, 'A wide family');
  const params = { projectId: wide.id };
  const list = await lead.must(families.list, { params });
  const familyId = list.find(({ name }) => name === 'c')?.id ?? '';
  const letters = 'ACDEFGHIKLMNPQRSTVWY';
  const row = (at: number) =>
    Array.from(
      { length: 80 },
      (_, place) => letters[(place * 7 + (place < 40 ? at : Math.floor(at / 20))) % 20],
    ).join('');
  const text = Array.from({ length: 60 }, (_, at) => `>row_${at}\n${row(at)}\n`).join('');
  const { body } = await lead.upload(wide.id, { kind: 'alignment', familyId }, 'wide.afa', Buffer.from(text));
  expect((await lead.settled(wide.id, body.id)).state).toBe('done');
  const [first] = await lead.must(families.proteins, { params: { ...params, familyId } });
  const count = (endpoint: Endpoint, input: object) =>
    countQueries(server.container.source, () => askAny(server.origin, lead.token, endpoint, input));
  const pages = async (projectId: string, proteinId: string) => {
    await lead.must(projects.list);
    return [
      (await count(residues.passport, { params: { projectId, proteinId, residueIndex: 40 } })).length,
      (await count(residues.locate, { params: { projectId }, query: { text: 'c_41' } })).length,
    ];
  };
  const narrow = await pages(stage.projectId, stage.protein('ATPE_ECOLI').id);
  expect(await pages(wide.id, first?.id ?? '')).toEqual(narrow);
  const passport = await lead.must(residues.passport, {
    params: { ...params, proteinId: first?.id ?? '', residueIndex: 40 },
  });
  expect(passport.equivalents).toHaveLength(59);
});
