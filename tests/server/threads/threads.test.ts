import { randomUUID } from 'node:crypto';
import { annotations, plans, threads, type Subject } from '@/shared/contracts';
import { addMember, type TestPerson } from '@/tests/support/person';
import { startTestServer, type TestServer } from '@/tests/support/server';
import { pinAt, stageAlignment, stageStructure, type Stage } from '@/tests/support/stage';

let server: TestServer;
let stage: Stage;
let contributor: TestPerson;
beforeAll(async () => {
  server = await startTestServer();
  stage = await stageAlignment(server);
  contributor = await addMember(stage.lead, stage.projectId, 'contributor');
});
afterAll(() => server.close());

const of = <More extends object>(more = {} as More) => ({ params: { projectId: stage.projectId, ...more } });
const residue = (residueIndex: number): Subject => ({
  kind: 'residue',
  proteinId: stage.protein('ATPE_ECOLI').id,
  residueIndex,
});
const keyOf = (index: number) => `residue:${stage.protein('ATPE_ECOLI').id}:${index}`;
const post = (subject: Subject, text: string, by = contributor) =>
  by.ask(threads.post, { ...of(), body: { clientKey: randomUUID(), subject, text } });
const posted = async (subject: Subject, text: string, by?: TestPerson) => {
  const answer = await post(subject, text, by);
  expect(answer.status).toBe(201);
  return answer.body;
};
const read = (subjectKey: string, query: object = {}) =>
  stage.lead.must(threads.ofSubject, { ...of({ subjectKey }), query });

test('before the first message a subject has its caption and no thread', async () => {
  expect(await read(keyOf(9))).toMatchObject({
    thread: null,
    caption: 'c Y10, ATPE_ECOLI',
    residue: { letter: 'Y', label: '10' },
    messages: [],
    earlier: null,
  });
});

test('each kind of subject is called by its name', async () => {
  const annotation = await pinAt(stage, 'ATPE_ECOLI', 60, 'Carries the ion.')(stage.lead);
  const mutant = await stage.lead.must(plans.makeMutant, {
    ...of(),
    body: { proteinId: stage.protein('ATPE_ECOLI').id, changes: 'D61N', constructId: null, reason: '' },
  });
  const { structureId } = await stageStructure(stage, 'structures/3bkd.pdb', false);
  const captions: [Subject, string][] = [
    [residue(60), 'c D61, ATPE_ECOLI'],
    [{ kind: 'annotation', id: annotation.id }, 'ion site: Carries the ion.'],
    [{ kind: 'mutant', id: mutant.id }, 'D61N'],
    [{ kind: 'structure', id: structureId }, '3bkd'],
  ];
  for (const [subject, caption] of captions) {
    const { thread } = await posted(subject, 'Well?');
    expect(thread).toMatchObject({ subject, caption, messageCount: 1, lastMessage: { text: 'Well?' } });
  }
  const { threads: list } = await stage.lead.must(threads.list, of());
  expect(list.slice(0, 4).map(({ caption }) => caption)).toEqual(
    captions.map(([, caption]) => caption).reverse(),
  );
});

test('messages are read in pages from the newest, each once, in the order of their numbers', async () => {
  const texts = Array.from({ length: 11 }, (_, at) => `Message ${at}`);
  for (const text of texts) await posted(residue(5), text);
  const seen: string[] = [];
  let before: number | undefined;
  do {
    const page = await read(keyOf(5), { limit: 4, ...(before && { before }) });
    expect(page.thread?.messageCount).toBe(11);
    seen.unshift(...page.messages.map(({ text }) => text));
    before = page.earlier ?? undefined;
  } while (before);
  expect(seen).toEqual(texts);
});

test('threads are read in pages, the one spoken in last first, each once', async () => {
  for (let at = 10; at < 17; at += 1) await posted(residue(at), 'Here.');
  await posted(residue(12), 'Here again.');
  const seen: string[] = [];
  let before: number | undefined;
  do {
    const page = await stage.lead.must(threads.list, {
      ...of(),
      query: { limit: 3, ...(before && { before }) },
    });
    seen.push(...page.threads.map(({ subjectKey }) => subjectKey));
    before = page.next ?? undefined;
  } while (before);
  expect(seen.slice(0, 7)).toEqual([12, 16, 15, 14, 13, 11, 10].map(keyOf));
  expect(new Set(seen).size).toBe(seen.length);
});

test('two who write the first message at once make one thread', async () => {
  const both = await Promise.all([posted(residue(20), 'One.'), posted(residue(20), 'Two.', stage.lead)]);
  expect(new Set(both.map(({ thread }) => thread.id)).size).toBe(1);
  expect((await read(keyOf(20))).thread?.messageCount).toBe(2);
});

test('what is written stays the text it is', async () => {
  const texts = [
    '<script>alert(1)</script>',
    '[click](javascript:alert(1)) ![x](data:text/html,x)',
    '**bold** `E62Q` βE188 🧬🧬 \u202Edcba\u202C',
    "'; DROP TABLE message; --",
    'a\n\n\tb\u0000c',
    'x'.repeat(10_000),
    '🧬'.repeat(5000),
  ];
  for (const text of texts) expect((await posted(residue(30), text)).message.text).toBe(text);
  expect((await read(keyOf(30))).messages.map(({ text }) => text)).toEqual(texts);
});

test.each([
  ['nothing', '', 'Write something.'],
  ['blanks', ' \n\t ', 'Write something.'],
  ['10,001 characters', 'x'.repeat(10_001), 'At most 10,000 characters.'],
])('a message of %s is refused in words', async (_, text, message) => {
  const answer = await post(residue(31), text);
  expect([answer.status, answer.body.fields]).toEqual([400, [{ path: 'text', message }]]);
});

test('a subject that is none, or that is behind the end, is not there', async () => {
  const proteinId = stage.protein('ATPE_ECOLI').id;
  for (const subjectKey of [
    'x',
    'residue',
    `residue:${proteinId}`,
    `residue:${proteinId}:`,
    `residue:${proteinId}:1e1`,
    `residue:${proteinId}:0x1`,
    `residue:${proteinId}:-1`,
    `residue:${proteinId}:79`,
    `residue:${proteinId}:1:2`,
    `annotation:${proteinId}`,
    `mutant:${proteinId}`,
    `structure:${proteinId}`,
    `path:${proteinId}`,
    'annotation:',
    "annotation:' OR 1=1",
  ]) {
    const answer = await stage.lead.ask(threads.ofSubject, of({ subjectKey }));
    expect([subjectKey, answer.status]).toEqual([subjectKey, 404]);
  }
  const answer = await post(residue(79), 'Hello?');
  expect([answer.status, answer.body.code]).toEqual([404, 'not-found']);
});

test('a caption follows what it names', async () => {
  const annotation = await pinAt(stage, 'ATPE_ECOLI', 23, 'First words.')(stage.lead);
  const subject = { kind: 'annotation' as const, id: annotation.id };
  await posted(subject, 'Sure?');
  const content = { kind: 'note' as const, text: 'Second words.', confidence: 'low' as const, evidence: [] };
  await stage.lead.must(annotations.edit, {
    ...of({ annotationId: annotation.id }),
    version: annotation.version,
    body: content,
  });
  expect((await read(`annotation:${annotation.id}`)).caption).toBe('note: Second words.');
});
