// What typed addresses can mean, on real files: 4bem.pdb with the rows of c_small_mafft.afa.
import { residues, type Reading } from '@/shared/contracts';
import { startTestServer, type TestServer } from '@/tests/support/server';
import { pinAt, stageAlignment, stageStructure, type Stage } from '@/tests/support/stage';

let server: TestServer;
let stage: Stage;
beforeAll(async () => {
  server = await startTestServer();
  stage = await stageAlignment(server);
  await stageStructure(stage, 'structures/4bem.pdb');
});
afterAll(() => server.close());

const ask = (text: string) =>
  stage.lead.ask(residues.locate, { params: { projectId: stage.projectId }, query: { text } });
const locate = async (text: string) => {
  const answer = await ask(text);
  expect([text, answer.status]).toEqual([text, 200]);
  return answer.body;
};
const short = ({ residue, mismatch }: Reading) =>
  `${residue.organism} ${residue.letter}${residue.label}${mismatch ? ` (${mismatch})` : ''}`;
const fitting = (readings: Reading[]) => readings.filter(({ mismatch }) => mismatch === null).map(short);

test('cE62 is the glutamate of the ring; the others in family c are told to carry another letter', async () => {
  const { readings } = await locate('cE62');
  expect(readings.map(short)).toEqual([
    'ATPE2_ACEWO_4BEM E62',
    'ATPE_ECOLI A62 (says Glu, is Ala)',
    'ATPE_VIBCH V62 (says Glu, is Val)',
    'ATP9_YEAST_3U32 G62 (says Glu, is Gly)',
    'ATPE1_ACEWO_4BEM T62 (says Glu, is Thr)',
  ]);
  expect(new Set(readings.map(({ group }) => group)).size).toBe(1);
});

test('c62 lists each family, chain and amino acid it can mean, each with the spelling that leaves it alone', async () => {
  const { readings } = await locate('c62');
  const groups = new Map(readings.map(({ group, spelling }) => [group, spelling]));
  expect([...groups]).toEqual([
    ['Family c, residue 62', 'c_62'],
    ['Chain C, author number 62', 'C:62'],
    ['Amino acid Cys, number 62', 'Cys62'],
  ]);
  for (const [group, spelling] of groups) {
    const only = await locate(spelling);
    expect(new Set(only.readings.map((reading) => reading.group))).toEqual(new Set([group]));
  }
  expect(readings.every(({ reason }) => reason.length > 0)).toBe(true);
});

test('A:62 is the residue of chain A, J:79 that of chain J', async () => {
  expect((await locate('A:62')).readings.map(short)).toEqual(['ATPE2_ACEWO_4BEM E62']);
  expect((await locate('J:79')).readings.map(short)).toEqual(['ATPE1_ACEWO_4BEM E79']);
  expect((await locate('A:62')).readings[0]?.residue.residueIndex).toBe(61);
});

test('E59 is first the glutamate 59 of yeast', async () => {
  const { readings, notReadAs } = await locate('E59');
  expect(readings.map(short)[0]).toBe('ATP9_YEAST_3U32 E59');
  expect(notReadAs).toEqual(['Not read as family E: this project has none.']);
});

// Source: handbook 6.3, `at := "@" organism-or-protein`.
test('behind @ stands whose residue it is, for chains too', async () => {
  expect((await locate('D61 @ ECOLI')).readings.map(short)).toEqual(['ATPE_ECOLI D61']);
  expect((await locate('D61 @ ecoli')).readings.map(short)).toEqual(['ATPE_ECOLI D61']);
  expect((await locate('c_59 @ ATP9 YEAST')).readings.map(short)).toEqual(['ATP9_YEAST_3U32 E59']);
  expect((await locate('A:62 @ acewo')).readings.map(short)).toEqual(['ATPE2_ACEWO_4BEM E62']);
  expect((await locate('A:62 @ 4bem')).readings.map(short)).toEqual(['ATPE2_ACEWO_4BEM E62']);
  expect((await locate('A:62 @ ECOLI')).readings).toEqual([]);
});

test('a change keeps what it changes to, and says where its letter does not stand', async () => {
  const { readings } = await locate('cE62Q');
  expect(readings.map(({ mutationTo }) => mutationTo)).toEqual(readings.map(() => 'Q'));
  expect(fitting(readings)).toEqual(['ATPE2_ACEWO_4BEM E62']);
  expect((await locate('D59N')).readings.map(short)).toContain('ATP9_YEAST_3U32 E59 (says Asp, is Glu)');
});

test('pins are counted where they are', async () => {
  await pinAt(stage, 'ATPE2_ACEWO_4BEM', 61)(stage.lead);
  const { readings } = await locate('cE62');
  expect(readings.map(({ pinCount }) => pinCount)).toEqual([1, 0, 0, 0, 0]);
});

test.each([
  'xyzzy',
  '',
  '   ',
  '?',
  '<b>62</b>',
  '<script>alert(1)</script>',
  "'; DROP TABLE protein; --",
  '\\',
  'c\\62',
  '🧬62',
  'c٦٢',
  'A:9999',
  'c99999999999999999999',
  'c-99999999999999999999',
  '\u0000c62',
  'x'.repeat(200),
  '62 @ %',
  '62 @ _',
  '62 @ __',
  '62 @ E%I',
  '62 @ A_PE%',
  '62 @ \\',
  '62 {%}',
  '62 {sequ_nce}',
  '%',
  '_',
  'c%',
  '%62',
  'A:62 @ %',
  'A:62 @ _',
  '%:62',
  '_:62',
])('%j means nothing here, and is answered', async (text) => {
  const { readings } = await locate(text);
  expect(readings).toEqual([]);
});

test('a chain that has no such residue is named, so that nobody waits for more', async () => {
  const { notReadAs } = await locate('A:9999');
  expect(notReadAs).toContain('Chain A: no current structure has a residue 9999 there.');
});

test('10,000 characters are refused, with how many may be sent', async () => {
  const answer = await ask('c'.repeat(10_000));
  expect(answer.status).toBe(400);
  expect(answer.body.fields).toEqual([
    { path: 'query.text', message: 'An address has at most 200 characters.' },
  ]);
});

test('an address that is asked twice, or not at all, is refused', async () => {
  const base = `${server.origin}/api/v1/projects/${stage.projectId}/locate`;
  const headers = { authorization: `Bearer ${stage.lead.token}` };
  for (const query of ['', '?text=c62&text=c61', '?text[]=c62', '?text=c62&other=1']) {
    const response = await fetch(`${base}${query}`, { headers });
    expect([query, response.status]).toEqual([query, 400]);
  }
});

test('a chain that is left out is not read, and says so', async () => {
  const other = await stageAlignment(server);
  await stageStructure(other, 'structures/3bkd.pdb');
  const params = { projectId: other.projectId };
  const answer = await other.lead.must(residues.locate, { params, query: { text: 'A:30' } });
  expect(answer.readings).toEqual([]);
  expect(answer.notReadAs).toEqual([
    '3bkd, chain A: it has a residue 30, but no map leads from there to a protein.',
  ]);
});
