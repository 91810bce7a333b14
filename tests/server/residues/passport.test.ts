// The passport of residues of real files: 4bem.pdb on the rows of c_small_mafft.afa.
import { families, residues, type Passport } from '@/shared/contracts';
import { carboxylateOf } from '@/tests/support/landmarks';
import { readFixtureJson } from '@/tests/support/read-fixture';
import { startTestServer, type TestServer } from '@/tests/support/server';
import { stageAlignment, stageStructure, type RowName, type Stage } from '@/tests/support/stage';

let server: TestServer;
let stage: Stage;
beforeAll(async () => {
  server = await startTestServer();
  stage = await stageAlignment(server);
  await stageStructure(stage, 'structures/4bem.pdb');
});
afterAll(() => server.close());

const rowOf: [RowName, string, string][] = [
  ['ATPE_ECOLI', 'E. coli', 'c'],
  ['ATP9_YEAST_3U32', 'S. cerevisiae', 'c'],
  ['ATPE2_ACEWO_4BEM', 'Acetobacterium woodii', 'c2/c3'],
  ['ATPE1_ACEWO_4BEM', 'Acetobacterium woodii', 'c1'],
];
/** Source: landmarks.json, membrane carboxylate of each organism. */
const carboxylate = new Map(
  rowOf.map(([row, system, family]) => [row, carboxylateOf(system, family)] as const),
);
const landmark = (row: RowName) => {
  const found = carboxylate.get(row);
  if (!found) throw new Error(row);
  return found;
};

const passport = (row: RowName, residueIndex: number): Promise<Passport> =>
  stage.lead.must(residues.passport, {
    params: { projectId: stage.projectId, proteinId: stage.protein(row).id, residueIndex },
  });

test.each(rowOf.map(([row]) => row))(
  'the carboxylate of %s is each other organism’s own carboxylate',
  async (row) => {
    const here = landmark(row);
    const page = await passport(row, here.label - 1);
    expect([page.residue.letter, page.residue.label]).toEqual([here.aminoAcid, String(here.label)]);
    const seen = new Map(page.equivalents.map((one) => [one.organism, `${one.letter}${one.label}`]));
    for (const [other, { aminoAcid, label }] of carboxylate) {
      if (other !== row) expect([other, seen.get(other)]).toEqual([other, `${aminoAcid}${label}`]);
    }
    expect(page.equivalents).toHaveLength(4);
    expect(page.gaps).toEqual([]);
  },
);

test('what the other rows carry in the column adds up, with organisms', async () => {
  const { column } = await passport('ATPE2_ACEWO_4BEM', 61);
  expect(column).toMatchObject({ alignmentName: 'c_small_mafft', revision: 1, rowCount: 5, gapCount: 0 });
  expect(
    column?.shares.map(({ letter, count, organisms }) => [letter, count, [...organisms].sort()]),
  ).toEqual([
    ['E', 3, ['ATP9_YEAST_3U32', 'ATPE1_ACEWO_4BEM', 'ATPE2_ACEWO_4BEM']],
    ['D', 2, ['ATPE_ECOLI', 'ATPE_VIBCH']],
  ]);
});

// Source: handbook 8.4: same letter strong, BLOSUM62 > 0 (D against E: 2) good.
test('equivalents are graded by how their letters relate', async () => {
  const { equivalents } = await passport('ATPE2_ACEWO_4BEM', 61);
  expect(equivalents.map(({ organism, grade, letterRelation }) => [organism, grade, letterRelation])).toEqual(
    [
      ['ATPE_ECOLI', 'good', 'similar'],
      ['ATPE_VIBCH', 'good', 'similar'],
      ['ATP9_YEAST_3U32', 'strong', 'same'],
      ['ATPE1_ACEWO_4BEM', 'strong', 'same'],
    ],
  );
});

// Source: handbook 1: nine chains A–I carry Glu62, chain J Glu79; its second hairpin has Gln162 instead.
test('its chain copies are A to I at 62, and chain J has its own at 79', async () => {
  const copies = (await passport('ATPE2_ACEWO_4BEM', 61)).copies;
  expect(
    copies.map(({ authorId, label, letter, state, confirmed }) => [
      authorId,
      label,
      letter,
      state,
      confirmed,
    ]),
  ).toEqual([...'ABCDEFGHI'].map((chain) => [chain, '62', 'E', 'observed', true]));
  const inJ = (await passport('ATPE1_ACEWO_4BEM', 78)).copies;
  expect(inJ.map(({ authorId, label, letter }) => [authorId, label, letter])).toEqual([['J', '79', 'E']]);
  const gln = await passport('ATPE1_ACEWO_4BEM', 161);
  expect([gln.residue.letter, gln.copies[0]?.label, gln.copies[0]?.letter]).toEqual(['Q', '162', 'Q']);
});

interface ExpectedMap {
  jobs: {
    structure: string;
    chain: string;
    row: RowName;
    mapping: [label: string, letter: string, column: number, rowLetter: string][];
  }[];
}
// Source: mapping.json, made with Biopython 1.80 (see its `source`): author number, letter, column from 1, row letter.
const mapped = readFixtureJson<ExpectedMap>('expected/mapping.json').jobs.filter(
  (job) => job.structure === '4bem.pdb',
);
test.each(mapped.map((job) => [job.chain, job] as const))(
  'chain %s: copies and columns are those an outside library finds',
  async (chain, { row, mapping }) => {
    expect(mapping.length).toBeGreaterThan(80);
    const sample = mapping.filter((_, at) => at % 9 === 0 || at === mapping.length - 1);
    for (const [label, letter, column, rowLetter] of sample) {
      const page = await passport(row, Number(label) - 1);
      const copy = page.copies.find(({ authorId }) => authorId === chain);
      expect([label, copy?.label, copy?.letter, page.residue.letter, page.column?.column]).toEqual([
        label,
        label,
        letter,
        rowLetter,
        column - 1,
      ]);
    }
  },
);

test('previous and next walk the protein and end at its ends', async () => {
  const length = stage.protein('ATPE_ECOLI').length;
  const first = await passport('ATPE_ECOLI', 0);
  expect([first.previous, first.residue.label, first.next?.label]).toEqual([null, '1', '2']);
  const last = await passport('ATPE_ECOLI', length - 1);
  expect([last.previous?.label, last.residue.label, last.next]).toEqual([
    String(length - 1),
    String(length),
    null,
  ]);
});

test.each([79, 100_000, 2_147_483_648, 9_007_199_254_740_991])(
  'there is no residue behind the end (%d), and none before the start',
  async (residueIndex) => {
    for (const index of [residueIndex, -1, 0.5]) {
      const answer = await stage.lead.ask(residues.passport, {
        params: {
          projectId: stage.projectId,
          proteinId: stage.protein('ATPE_ECOLI').id,
          residueIndex: index,
        },
      });
      expect([index, answer.status, answer.body.code]).toEqual([index, 404, 'not-found']);
    }
  },
);

describe('an offset numbering', () => {
  const set = async (offset: number, preferred: boolean, skipZero = false) => {
    const params = { projectId: stage.projectId, proteinId: stage.protein('ATPE_VIBCH').id };
    const { version } = await stage.lead.must(families.protein, { params });
    const body = { name: 'precursor', offset, skipZero, preferred };
    return stage.lead.must(families.setOffsetNumbering, { params, version, body });
  };
  const locate = (text: string) =>
    stage.lead.must(residues.locate, { params: { projectId: stage.projectId }, query: { text } });

  test('stands beside the others until it is preferred; then labels and the locator follow it', async () => {
    await set(25, false);
    const beside = await passport('ATPE_VIBCH', 59);
    expect(beside.labels).toEqual([
      { numbering: 'sequence', kind: 'sequence', preferred: true, label: '60' },
      { numbering: 'precursor', kind: 'offset', preferred: false, label: '85' },
    ]);
    expect(beside.residue).toMatchObject({ label: '60', numbering: 'sequence' });

    await set(25, true);
    const first = await passport('ATPE_VIBCH', 59);
    expect(first.residue).toMatchObject({ letter: 'D', label: '85', numbering: 'precursor' });
    // Proteins without this numbering keep the one they were born with.
    const ecoli = await passport('ATPE_ECOLI', 60);
    expect(ecoli.residue).toMatchObject({ label: '61', numbering: 'sequence' });
    expect(ecoli.equivalents.find(({ organism }) => organism === 'ATPE_VIBCH')).toMatchObject({
      label: '85',
      numbering: 'precursor',
    });
    const { readings } = await locate('cD85');
    expect(readings.filter(({ mismatch }) => mismatch === null)).toEqual([
      expect.objectContaining({
        residue: expect.objectContaining({ organism: 'ATPE_VIBCH', residueIndex: 59, label: '85' }),
      }),
    ]);
  });

  test('set again it replaces itself: the old labels lead nowhere', async () => {
    await set(-60, true, true);
    const labels = await Promise.all(
      [58, 59, 60].map(async (at) => (await passport('ATPE_VIBCH', at)).residue.label),
    );
    // Without a zero the labels run …, -2, -1, 1.
    expect(labels).toEqual(['-2', '-1', '1']);
    const byOld = await locate('cD85');
    expect(byOld.readings.filter(({ mismatch }) => mismatch === null)).toEqual([]);
    const byNew = await locate('c-D-1');
    expect(byNew.readings.map(({ residue }) => [residue.organism, residue.residueIndex])).toContainEqual([
      'ATPE_VIBCH',
      59,
    ]);
    await set(0, false);
    expect((await passport('ATPE_VIBCH', 59)).residue).toMatchObject({ label: '60', numbering: 'sequence' });
  });
});
