import { annotations, audit, projects, type Annotation } from '@/shared/contracts';
import { addMember, type TestPerson } from '@/tests/support/person';
import { startTestServer, type TestServer } from '@/tests/support/server';
import {
  pinAt,
  stageAlignment,
  stageStructure,
  type Stage,
  type StagedStructure,
} from '@/tests/support/stage';

let server: TestServer;
let stage: Stage;
let structure: StagedStructure;
let contributor: TestPerson;
let curator: TestPerson;
beforeAll(async () => {
  server = await startTestServer();
  stage = await stageAlignment(server);
  structure = await stageStructure(stage, 'structures/4bem.pdb');
  [contributor, curator] = await Promise.all([
    addMember(stage.lead, stage.projectId, 'contributor'),
    addMember(stage.lead, stage.projectId, 'curator'),
  ]);
});
afterAll(() => server.close());

const of = <More extends object>(more = {} as More) => ({ params: { projectId: stage.projectId, ...more } });
const at = (row: Parameters<Stage['protein']>[0], residueIndex: number) => ({
  proteinId: stage.protein(row).id,
  residueIndex,
});
const content = {
  kind: 'ion site' as const,
  text: 'Carries the **ion**.',
  confidence: 'high' as const,
  evidence: [{ kind: 'coordinates' as const, reference: 'PDB 4BEM' }],
};
type Body = typeof content & { pins: object[] };
const make = (change: Partial<Body> | object, by: TestPerson = contributor) =>
  by.ask(annotations.make, {
    ...of(),
    body: { pins: [at('ATPE2_ACEWO_4BEM', 61)], ...content, ...change } as never,
  });
const made = async (change: Partial<Body> | object = {}, by?: TestPerson): Promise<Annotation> => {
  const answer = await make(change, by);
  expect(answer.status).toBe(201);
  return answer.body;
};
const setStatus = (by: TestPerson, { id, version }: Annotation, status: Annotation['status'], reason = '') =>
  by.ask(annotations.setStatus, { ...of({ annotationId: id }), version, body: { status, reason } });
const here = (row: Parameters<Stage['protein']>[0], residueIndex: number) =>
  stage.lead.must(annotations.atResidue, of(at(row, residueIndex)));

test('an annotation says what, where, on what grounds, how sure, by whom and when', async () => {
  const before = Date.now();
  const annotation = await made();
  expect(annotation).toMatchObject({
    shape: 'point',
    status: 'proposed',
    statusReason: '',
    ...content,
    versionNumber: 1,
    version: 1,
    by: { id: contributor.id, name: 'The contributor' },
    changedBy: { id: contributor.id },
  });
  expect(annotation.pins).toEqual([
    expect.objectContaining({ letter: 'E', label: '62', family: 'c', structureId: null, chains: null }),
  ]);
  expect(Date.parse(annotation.at)).toBeGreaterThanOrEqual(before - 1);
});

test('each edit keeps the version before it, with its author', async () => {
  const first = await made();
  const edited = await curator.must(annotations.edit, {
    ...of({ annotationId: first.id }),
    version: first.version,
    body: { ...content, text: 'Carries sodium.', confidence: 'medium', evidence: [] },
  });
  expect(edited).toMatchObject({
    text: 'Carries sodium.',
    versionNumber: 2,
    version: 2,
    by: { id: contributor.id },
    changedBy: { id: curator.id },
    evidence: [],
  });
  const versions = await stage.lead.must(annotations.versions, of({ annotationId: first.id }));
  expect(versions.map(({ number, text, confidence, by }) => [number, text, confidence, by.id])).toEqual([
    [2, 'Carries sodium.', 'medium', curator.id],
    [1, content.text, 'high', contributor.id],
  ]);
  const query = { subjectKind: 'annotation', subjectId: first.id };
  const { entries } = await stage.lead.must(audit.list, { ...of(), query });
  expect(entries.map(({ action, by }) => [action, by.id])).toEqual([
    ['annotation.edited', curator.id],
    ['annotation.made', contributor.id],
  ]);
  expect(entries[0]?.before).toMatchObject({ text: content.text });
  expect(entries[0]?.after).toMatchObject({ text: 'Carries sodium.' });
});

describe('status', () => {
  // Every step there is; all others are refused.
  const steps: Record<Annotation['status'], Annotation['status'][]> = {
    proposed: ['accepted', 'contested', 'retired'],
    accepted: ['contested', 'retired'],
    contested: ['accepted', 'retired', 'proposed'],
    retired: ['proposed'],
  };
  const all = Object.keys(steps) as Annotation['status'][];
  const toReach: Record<Annotation['status'], Annotation['status'][]> = {
    proposed: [],
    accepted: ['accepted'],
    contested: ['contested'],
    retired: ['retired'],
  };
  test.each(all.flatMap((from) => all.map((to) => [from, to] as const)))('%s → %s', async (from, to) => {
    let annotation = await made();
    for (const step of toReach[from]) {
      const answer = await setStatus(curator, annotation, step, 'For the test.');
      annotation = answer.body;
    }
    const answer = await setStatus(curator, annotation, to, 'It is so.');
    if (steps[from].includes(to)) {
      expect(answer.status).toBe(200);
      expect(answer.body).toMatchObject({
        status: to,
        statusReason: 'It is so.',
        version: annotation.version + 1,
      });
    } else {
      expect([answer.status, answer.body.code]).toEqual([409, 'no-such-step']);
      const list = await here('ATPE2_ACEWO_4BEM', 61);
      expect(list.find(({ id }) => id === annotation.id)).toMatchObject({
        status: from,
        version: annotation.version,
      });
    }
  });

  test.each(['contested', 'retired'] as const)('%s asks for a reason', async (status) => {
    const annotation = await made();
    for (const reason of ['', '   ', '\n\t']) {
      const answer = await setStatus(curator, annotation, status, reason);
      expect([answer.status, answer.body.code]).toEqual([422, 'reason-needed']);
      expect(answer.body.fields).toEqual([{ path: 'reason', message: 'Write a reason.' }]);
    }
  });

  test('a status makes no new version of the text', async () => {
    const annotation = await made();
    await setStatus(curator, annotation, 'accepted');
    const versions = await stage.lead.must(annotations.versions, of({ annotationId: annotation.id }));
    expect(versions).toHaveLength(1);
  });
});

describe('by equivalence', () => {
  test('a pin shows on its own residue, and with its grade on each homolog', async () => {
    const { id } = await made({ text: 'Shown by equivalence.' });
    const own = (await here('ATPE2_ACEWO_4BEM', 61)).find((one) => one.id === id);
    expect(own?.viaEquivalence).toBeNull();
    // Source: handbook 8.4 and landmarks.json: E62 ↔ D61 (similar, good), E59 and E79 (same, strong).
    for (const [row, index, grade] of [
      ['ATPE_ECOLI', 60, 'good'],
      ['ATPE_VIBCH', 59, 'good'],
      ['ATP9_YEAST_3U32', 58, 'strong'],
      ['ATPE1_ACEWO_4BEM', 78, 'strong'],
    ] as const) {
      const there = (await here(row, index)).find((one) => one.id === id);
      expect([row, there?.viaEquivalence?.grade]).toEqual([row, grade]);
      expect(there?.viaEquivalence?.residue).toMatchObject({ letter: 'E', label: '62' });
      // The pin itself stays where it was put.
      expect(there?.pins).toEqual(own?.pins);
    }
    const beside = await here('ATPE_ECOLI', 59);
    expect(beside.map((one) => one.id)).not.toContain(id);
  });

  test('what is pinned here comes before what is pinned elsewhere, newest first', async () => {
    const [row, index] = ['ATPE_VIBCH', 20] as const;
    const own = await made({ pins: [at(row, index)], text: 'older' });
    const page = await here(row, index);
    expect(page.map(({ id }) => id)).toEqual([own.id]);
    const via = await made({ pins: [at('ATPE_ECOLI', 21)], text: 'on the homolog' });
    const newer = await made({ pins: [at(row, index)], text: 'newer' });
    expect((await here(row, index)).map(({ id }) => id)).toEqual([newer.id, own.id, via.id]);
  });
});

describe('pins', () => {
  test('a pair holds two residues in their order, and shows on both', async () => {
    const pins = [at('ATPE_ECOLI', 60), at('ATPE_ECOLI', 23)];
    const pair = await made({ pins, kind: 'contact' });
    expect(pair).toMatchObject({ shape: 'pair' });
    expect(pair.pins.map(({ residueIndex }) => residueIndex)).toEqual([60, 23]);
    for (const index of [60, 23]) {
      const found = (await here('ATPE_ECOLI', index)).find(({ id }) => id === pair.id);
      expect(found?.viaEquivalence).toBeNull();
    }
  });

  test('three and more are a set', async () => {
    const pins = [0, 1, 2].map((index) => at('ATPE_ECOLI', index));
    expect((await made({ pins })).shape).toBe('set');
  });

  test('the same residue twice is refused, also when its id is in capitals', async () => {
    const pin = at('ATPE_ECOLI', 60);
    for (const twice of [pin, { ...pin, proteinId: pin.proteinId.toUpperCase() }]) {
      const answer = await make({ pins: [pin, at('ATPE_ECOLI', 1), twice] });
      expect([answer.status, answer.body.code]).toEqual([422, 'pinned-twice']);
    }
  });

  test('a residue behind the end is refused in words', async () => {
    const answer = await make({ pins: [at('ATPE_ECOLI', 79)] });
    expect([answer.status, answer.body.code]).toEqual([422, 'no-such-residue']);
    expect(answer.body.detail).toBe('The ATPE_ECOLI protein has 79 residues; there is none at place 80.');
  });

  test('a pin may speak of some chains of a structure; those must be there', async () => {
    const pin = { ...at('ATPE2_ACEWO_4BEM', 61), structureId: structure.structureId };
    const some = await made({ pins: [{ ...pin, chains: ['A', 'C'] }] });
    expect(some.pins[0]).toMatchObject({ structureId: structure.structureId, chains: ['A', 'C'] });
    const all = await made({ pins: [{ ...pin, chains: [] }] });
    expect(all.pins[0]).toMatchObject({ structureId: structure.structureId, chains: null });
    const none = await make({ pins: [{ ...pin, chains: ['A', 'a'] }] });
    expect([none.status, none.body.code]).toEqual([422, 'no-such-chain']);
    expect(none.body.detail).toBe('4bem has no chain a; its chains are A, B, C, D, E, F, G, H, I, J.');
    const { structureId: _, ...without } = pin;
    const floating = await make({ pins: [{ ...without, chains: ['A'] }] });
    expect([floating.status, floating.body.code]).toEqual([422, 'structure-needed']);
  });
});

describe('what people write', () => {
  test('markup and odd letters stay the text they are', async () => {
    const text =
      '<script>alert(1)</script> <img src=x onerror=alert(1)> [x](javascript:alert(1)) βE188 🧬 \u202Eabc';
    const reference = '<b>10.1000/x</b>';
    const { id } = await made({ text, evidence: [{ kind: 'publication', reference }] });
    const read = (await here('ATPE2_ACEWO_4BEM', 61)).find((one) => one.id === id);
    expect([read?.text, read?.evidence[0]?.reference]).toEqual([text, reference]);
  });

  test('8,000 characters are kept whole, also when each takes four bytes', async () => {
    const text = '🧬'.repeat(4000);
    expect((await made({ text })).text).toBe(text);
  });

  test.each([
    ['a text of 10,000 characters', { text: 'x'.repeat(10_000) }, 'text', 'At most 8,000 characters.'],
    ['an empty text', { text: '  ' }, 'text', 'Write what is known.'],
    ['a kind that is none', { kind: 'secret' }, 'kind', null],
    ['a confidence that is none', { confidence: 'certain' }, 'confidence', null],
    ['eleven grounds', { evidence: Array.from({ length: 11 }, () => content.evidence[0]) }, 'evidence', null],
    [
      'a reference of 10,000 characters',
      { evidence: [{ kind: 'other', reference: 'x'.repeat(10_000) }] },
      'evidence.0.reference',
      'At most 500 characters.',
    ],
    ['no pin', { pins: [] }, 'pins', null],
    [
      'fifty-one pins',
      { pins: Array.from({ length: 51 }, (_, index) => ({ proteinId: '0'.repeat(8), residueIndex: index })) },
      'pins',
      null,
    ],
    [
      'a residue by a half',
      { pins: [{ proteinId: '00000000-0000-4000-8000-000000000000', residueIndex: 0.5 }] },
      'pins.0.residueIndex',
      null,
    ],
    ['a status sent along', { status: 'accepted' }, '', null],
  ])('%s is refused where it stands', async (_, change, path, message) => {
    const answer = await make(change);
    expect([answer.status, answer.body.code]).toEqual([400, 'bad-request']);
    expect(answer.body.fields?.map((field) => field.path)).toContain(path);
    if (message) expect(answer.body.fields).toContainEqual({ path, message });
  });

  test('what was refused left nothing behind', async () => {
    const { head } = await stage.lead.must(projects.read, of());
    await make({ text: 'x'.repeat(10_000) });
    await make({ pins: [at('ATPE_ECOLI', 79)] });
    expect((await stage.lead.must(projects.read, of())).head).toBe(head);
  });
});

test('the list is read in pages, newest first, each annotation once', async () => {
  for (let index = 0; index < 5; index += 1) await pinAt(stage, 'ATPE_ECOLI', index)(contributor);
  const all = (await stage.lead.must(annotations.list, { ...of(), query: { limit: 100 } })).annotations;
  const seen: string[] = [];
  let before: string | undefined;
  for (let page = 0; page < 100; page += 1) {
    const query = { limit: 7, ...(before && { before }) };
    const reply = await stage.lead.must(annotations.list, { ...of(), query });
    seen.push(...reply.annotations.map(({ id }) => id));
    if (reply.next === null) break;
    before = reply.next;
  }
  expect(seen).toEqual(all.map(({ id }) => id));
  expect(seen).toEqual([...seen].sort().reverse());
});
