import fc from 'fast-check';
import { readDna, readDnaRecords } from '@/shared/sequence/construct/read-dna';

const codes = (text: string) => readDna(text).issues.map(({ code }) => code);

test('reads one FASTA record', () => {
  const { value, issues } = readDna('>pW-c3 a plasmid\nacgt ACGT\nTT\n');
  expect(value).toEqual({ name: 'pW-c3', description: 'a plasmid', bases: 'ACGTACGTTT', line: 1 });
  expect(issues).toEqual([]);
});

test('reads bare letters, and numbered sequence text with its heading and end mark', () => {
  expect(readDna('ACGTAC').value?.bases).toBe('ACGTAC');
  expect(readDna('ORIGIN\n        1 atggaaaacc tgaac\n       16 atg\n//\n').value?.bases).toBe(
    'ATGGAAAACCTGAACATG',
  );
  expect(readDna('\uFEFF>a\r\nAC\r\nGT\r\n').value?.bases).toBe('ACGT');
});

test('U is read as T, degenerate letters are kept, both are told once with their place', () => {
  const { value, issues } = readDna('>r\nAUGN\nRRUA');
  expect(value?.bases).toBe('ATGNRRTA');
  expect(issues.map(({ code, severity, line, column }) => [code, severity, line, column])).toEqual([
    ['uracil-read-as-thymine', 'warning', 2, 2],
    ['degenerate-bases', 'warning', 2, 4],
  ]);
});

test('letters that are no bases are each told with line and column, and nothing is read', () => {
  const { value, issues } = readDna('>r\nACGT\nAC-T!');
  expect(value).toBeNull();
  expect(issues.map(({ code, line, column }) => [code, line, column])).toEqual([
    ['unknown-base', 3, 3],
    ['unknown-base', 3, 5],
  ]);
});

test('a protein is recognised', () => {
  expect(codes('>p\nMENLNMDLLYMAAAVMMGLAAIGAAIGIGILGGKFLEGAARQPDLIP')).toContain('looks-like-protein');
});

test('several records ask for one, by name', () => {
  const text = '>a\nACG\n>b\nTTT\n>c\nGGG\n';
  expect(readDna(text).value).toBeNull();
  expect(readDna(text).issues[0]).toMatchObject({ code: 'several-records', severity: 'error', line: 3 });
  expect(readDna(text).issues[0]?.message).toContain('a, b, c');
  expect(readDna(text, { name: 'b' }).value?.bases).toBe('TTT');
  expect(readDna(text, { name: 'z' }).issues[0]?.code).toBe('record-not-found');
  expect(readDnaRecords(text).value).toHaveLength(3);
});

test('nothing, blanks, bytes and records without bases are refused in words', () => {
  expect(codes('')).toEqual(['empty']);
  expect(codes(' \n\t\n')).toEqual(['empty']);
  expect(codes('PK\u0003\u0004\u0000\u0001')).toEqual(['binary']);
  expect(codes('>only a title\n')).toEqual(['empty-record']);
  expect(codes('; a remark\n')).toEqual(['empty']);
});

test('limits are held: bases, records, names', () => {
  expect(readDna('ACGT'.repeat(10), { limits: { maxBases: 39 } }).issues[0]?.code).toBe('too-many-bases');
  expect(readDnaRecords('>a\nA\n>b\nC\n', { maxRecords: 1 }).issues[0]?.code).toBe('too-many-records');
  const named = readDna(`>${'n'.repeat(10_000)}\nACGT`);
  expect(named.value?.name).toHaveLength(200);
  expect(named.issues[0]?.code).toBe('name-shortened');
});

test('any text gives bases or an error, never an exception', () => {
  const soup = fc.string({ unit: fc.constantFrom(...'ACGTUNRacgt>;\n\r \t0129-*EFβ\u0000') });
  fc.assert(
    fc.property(fc.oneof(soup, fc.string()), (text) => {
      const { value, issues } = readDna(text);
      expect(value === null).toBe(issues.some(({ severity }) => severity === 'error'));
      if (value) expect(value.bases).toMatch(/^[ACGTRYSWKMBDHVN]+$/);
    }),
  );
});
