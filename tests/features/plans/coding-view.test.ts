import { reverseComplement } from '@/shared/sequence/construct/bases';
import { readDnaRecords } from '@/shared/sequence/construct/read-dna';
import { asFasta, viewCoding } from '@/features/plans/coding-view';
import { readFixtureJson } from '../../support/read-fixture';
import { buildProtein, operon, worked } from './support';

interface Translations {
  files: { file: string; entries: { name: string; translations: Record<string, string> }[] }[];
}
/** Table 11, as Biopython 1.80 translates it. */
function translationOf(record: string): string {
  const { files } = readFixtureJson<Translations>('expected/translate.json');
  const entries = files.find(({ file }) => file === 'vcholerae_atp_cds.fasta')?.entries;
  return entries?.find(({ name }) => name === record)?.translations['11'] ?? '';
}

const input = { dna: worked.construct, codingStart: worked.orfStart0 + 1, circular: true, geneticCode: 11 };
const protein = buildProtein(worked.protein);

test('the worked construct reads as its protein, with its stop where Biopython has it', () => {
  const view = viewCoding(input, protein);
  expect(view.first).toEqual({ codon: 'ATG', encodes: 'M', isStart: true });
  expect(view.coding).toMatchObject({
    residues: worked.protein.length,
    lengthBases: worked.orfEnd0_afterStop - worked.orfStart0,
    stopBase: worked.orfEnd0_afterStop - 2,
  });
  expect(view.match).toMatchObject({ identity: 1, coverage: 1, tags: [] });
  expect(view.issues.filter(({ severity }) => severity === 'error')).toEqual([]);
});

test('from a wrong start it says where the protein breaks, and offers the right one', () => {
  const view = viewCoding({ ...input, codingStart: worked.orfStart0 + 2 }, protein);
  expect(view.match).toBeNull();
  expect(view.issues.map(({ code }) => code)).toContain('protein-not-encoded');
  expect(view.suggestions[0]).toMatchObject({
    start: worked.orfStart0 + 1,
    strand: '+',
    codon: 'ATG',
    exact: true,
  });
});

test('DNA of the other strand is turned round, and then reads', () => {
  const turned = reverseComplement(worked.construct);
  const [suggestion] = viewCoding({ ...input, dna: turned }, protein).suggestions;
  expect(suggestion).toMatchObject({ strand: '-', exact: true });
  const again = viewCoding(
    { ...input, dna: reverseComplement(turned), codingStart: suggestion?.start ?? 0 },
    protein,
  );
  expect(again.match?.identity).toBe(1);
});

test('a tag before the protein: both its start and the protein’s own are offered', () => {
  const gene = worked.construct.slice(worked.orfStart0, worked.orfEnd0_afterStop);
  const dna = `TAAATGCATCACCATCACCATCAC${gene}`;
  const starts = viewCoding({ ...input, dna, circular: false, codingStart: 4 }, protein);
  expect(starts.suggestions.map(({ start, residuesBefore }) => [start, residuesBefore])).toEqual([
    [25, 0],
    [4, 7],
  ]);
  expect(starts.match?.tags).toEqual([{ end: 'N', residues: 'MHHHHHH', names: ['polyhistidine'] }]);
});

test('a variant is found by its open frame, with differences', () => {
  const at = worked.orfStart0 + 3 * 20;
  const dna = `${worked.construct.slice(0, at)}TGG${worked.construct.slice(at + 3)}`;
  const { suggestions } = viewCoding({ ...input, dna }, protein);
  expect(suggestions).toContainEqual(
    expect.objectContaining({ start: worked.orfStart0 + 1, strand: '+', exact: false }),
  );
});

test('several records wait for a choice; the chosen one reads on', () => {
  const view = viewCoding({ ...input, dna: operon }, protein);
  expect(view.records).toHaveLength(9);
  expect(view.bases).toBeNull();
  const record = view.records.find(({ name }) => name === 'VIBCH_atpE');
  if (!record) throw new Error('no such record');
  const text = asFasta(record);
  expect(readDnaRecords(text).value).toMatchObject([{ name: record.name, bases: record.bases }]);
  const alone = viewCoding({ dna: text, codingStart: 1, circular: false, geneticCode: 11 }, undefined);
  const protein11 = translationOf('VIBCH_atpE').replace('*', '');
  expect(alone.coding).toMatchObject({
    firstResidues: protein11.slice(0, 20),
    residues: protein11.length,
    stopBase: 3 * protein11.length + 1,
  });
});

test.each([
  ['a protein', 'MENLNMDLLYMAAAVMMGLAAIGAAIGIGILGG', 'looks-like-protein'],
  ['a letter that is no base', 'ATGAAA\nCCJGG', 'unknown-base'],
  ['bytes', 'ATG\u0000\u0001', 'binary'],
  ['a start outside', 'ATGAAATAA', 'start-outside'],
])('%s is told at its place', (_what, dna, code) => {
  const view = viewCoding({ dna, codingStart: 400, circular: false, geneticCode: 11 }, protein);
  expect(view.issues.map((issue) => issue.code)).toContain(code);
  expect(view.match).toBeNull();
});
