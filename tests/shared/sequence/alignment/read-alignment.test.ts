import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { AlignmentLimits } from '@/shared/sequence/alignment/limits';
import { readAlignment } from '@/shared/sequence/alignment/read-alignment';

const bytes = (text: string) => new TextEncoder().encode(text);
const read = (text: string, limits?: Partial<AlignmentLimits>) => readAlignment(bytes(text), limits);
/** `code line:column` of each issue. */
const places = (text: string, limits?: Partial<AlignmentLimits>) =>
  read(text, limits).issues.map((issue) => `${issue.code} ${issue.line ?? '-'}:${issue.column ?? '-'}`);
const fixture = (file: string) => readFileSync(join(__dirname, '../../../fixtures', file));

describe('a good file', () => {
  test('becomes rows with text, residues and segments', () => {
    const { value, issues } = read('>c_one first row\nMK-V\nL\n>c_two\nmkaV.\n');
    expect(issues).toEqual([]);
    expect(value).toMatchObject({ format: 'fasta', columnCount: 5 });
    expect(value?.rows[0]).toEqual({
      name: 'c_one',
      description: 'first row',
      text: 'MK-VL',
      residues: 'MKVL',
      segments: [
        { columnStart: 0, proteinStart: 0, length: 2 },
        { columnStart: 3, proteinStart: 2, length: 2 },
      ],
      line: 1,
    });
    expect(value?.rows[1]).toMatchObject({ text: 'mkaV.', residues: 'MKAV', line: 4 });
  });

  test.each([
    ['LF', '\n'],
    ['CRLF', '\r\n'],
    ['CR', '\r'],
  ])('reads the same with %s and a byte-order mark, blanks in lines and no last line end', (_, end) => {
    const { value, issues } = read(['\uFEFF>a', 'MK V', '', '>b', 'M K\t-'].join(end));
    expect(issues).toEqual([]);
    expect(value?.rows.map((row) => [row.name, row.text, row.line])).toEqual([
      ['a', 'MKV', 1],
      ['b', 'MK-', 4],
    ]);
  });

  test('keeps the numbers of a range in the name, and doubts wrong ones', () => {
    const { value, issues } = read('>x/13-15\nMKV\n>y/5-9\nMK-\n>z/9-5\nM-V\n');
    expect(value?.rows.map((row) => row.firstNumber)).toEqual([13, 5, undefined]);
    expect(issues.map((issue) => issue.code)).toEqual(['range-length', 'range-reversed']);
  });

  test('drops a stop at the end of rows, whether or not it makes a column', () => {
    expect(read('>a\nMKV*\n>b\nMKV\n').value?.rows.map((row) => row.text)).toEqual(['MKV', 'MKV']);
    const columns = read('>a\nMKV*\n>b\nMKVL\n');
    expect(columns.value?.rows.map((row) => row.text)).toEqual(['MKV-', 'MKVL']);
    const both = read('>a\nMKV*\n>b\nMK-*\n');
    expect(both.value).toMatchObject({ columnCount: 3 });
    expect(both.issues.map((issue) => [issue.code, issue.line, issue.column])).toEqual([
      ['stop-at-end', 2, 4],
    ]);
    expect(both.value?.rows.map((row) => row.text)).toEqual(['MKV', 'MK-']);
  });

  test('reads question marks as X with a warning', () => {
    const { value, issues } = read('>a\nM?V?\n>b\nMKVL\n');
    expect(value?.rows[0]).toMatchObject({ text: 'MXVX', residues: 'MXVX' });
    expect(issues).toMatchObject([{ code: 'residue-unknown', severity: 'warning', line: 2, column: 2 }]);
  });

  test('takes the first word after "> " with a warning, and Latin-1 text with a warning', () => {
    expect(read('> a b\nMK\n').value?.rows[0]).toMatchObject({ name: 'a', description: 'b' });
    expect(places('> a b\nMK\n')).toEqual(['name-after-space 1:1']);
    const latin = readAlignment(Uint8Array.from([0x3e, 0xe9, 0x0a, 0x4d, 0x4b]));
    expect(latin.value?.rows[0]?.name).toBe('é');
    expect(latin.issues.map((issue) => issue.code)).toEqual(['text-not-utf8']);
  });

  test('says when two rows hold the same residues', () => {
    expect(places('>a\nMK-V\n>b\nM-KV\n')).toEqual(['rows-equal 3:1']);
    expect(read('>a\nMK-V\n>b\nM-KV\n').value).not.toBeNull();
  });
});

describe('a bad file gives every problem with its place, and no value', () => {
  test('all at once: letters, lengths, names, empty rows, stops', () => {
    const text = '>a\nMK1V\n>a\nMKVLL\n>\nMKVL\n>d\n>e\n----\n>f\nM*VL\n>g\nM@V#\n';
    expect(read(text).value).toBeNull();
    expect(places(text)).toEqual([
      'letter-unknown 2:3',
      'row-length 3:1',
      'name-duplicate 3:1',
      'name-missing 5:1',
      'row-empty 7:1',
      'row-without-residues 8:1',
      'stop-inside-row 11:2',
      'letter-unknown 13:2',
      'letter-unknown 13:4',
    ]);
    const messages = read(text).issues.map((issue) => issue.message);
    expect(messages[0]).toContain('"1" in row "a"');
    expect(messages[1]).toContain('has 5 columns; 5 of 7 rows have 4.');
    expect(messages[2]).toContain('line 1');
  });

  test('columns count in the original line, blanks included', () => {
    expect(places('>a\n  M K\u00e9\n')).toEqual(['letter-unknown 2:6']);
  });

  test('a last row cut short is called so; sequences without gaps are called not aligned', () => {
    const cut = read('>a\nMKVL\n>b\nMK-L\n>c\nMK');
    expect(cut.issues).toMatchObject([{ code: 'row-length', line: 5 }]);
    expect(cut.issues[0]?.message).toContain('cut short');
    expect(places('>a\nMKVLI\n>b\nMKVL\n>c\nMK')).toEqual([
      'rows-not-aligned 3:1',
      'row-length 3:1',
      'row-length 5:1',
    ]);
  });

  test.each([
    ['empty', new Uint8Array(0), 'file-empty'],
    ['blank', bytes(' \n\n'), 'file-empty'],
    ['binary', Uint8Array.from([0x3e, 0x61, 0x0a, 0x4d, 0x00, 0x4b]), 'file-binary'],
    ['UTF-16', Uint8Array.from([0xff, 0xfe, 0x3e, 0x00]), 'file-binary'],
    ['coordinates in PDB format', fixture('structures/1A8O.pdb'), 'wrong-kind-coordinates'],
    ['PDBx/mmCIF', bytes('# comment\ndata_1ABC\nloop_\n_atom_site.id\n'), 'wrong-kind-coordinates'],
    ['Stockholm', bytes('# STOCKHOLM 1.0\n\na MKV\n//\n'), 'format-not-read-yet'],
    ['blocks', bytes('A multiple sequence alignment\n\na   MK-V\nb   MKKV\n'), 'format-not-read-yet'],
    ['blocks, other title', bytes('Title\n\na  MK-V 3\nb  MKKV 4\n   ** *\n'), 'format-not-read-yet'],
    ['a record', bytes('LOCUS       X 10 bp\nORIGIN\n'), 'wrong-kind-record'],
    ['reads', bytes('@r1\nACGT\n+\nIIII\n'), 'wrong-kind-reads'],
    ['a web page', bytes('<!DOCTYPE html><p>Not found'), 'wrong-kind-web-page'],
    ['prose', bytes('Dear all,\nplease find it below.\n'), 'kind-unknown'],
    ['a table', bytes('name,letter\nc,E\n'), 'kind-unknown'],
    ['coding DNA', fixture('dna/vcholerae_atp_cds.fasta'), 'rows-are-dna'],
  ])('%s is refused with a code of its own', (_, file, code) => {
    const { value, issues } = readAlignment(file);
    expect(value).toBeNull();
    expect(issues.map((issue) => issue.code)).toContain(code);
    for (const issue of issues) expect(issue.message).toMatch(/^[^\u0000]{10,400}$/);
  });

  test('a NUL byte is placed', () => {
    const { issues } = readAlignment(Uint8Array.from([0x3e, 0x61, 0x0d, 0x0a, 0x4d, 0x00]));
    expect(issues).toMatchObject([{ code: 'file-binary', line: 2, column: 2 }]);
  });
});

describe('limits are parameters', () => {
  test.each([
    ['file-too-large', { maxBytes: 5 }],
    ['too-many-rows', { maxRows: 1 }],
    ['too-many-columns', { maxColumns: 3 }],
    ['name-too-long', { maxNameLength: 2 }],
    ['description-cut', { maxDescriptionLength: 3 }],
  ] as const)('%s', (code, limits) => {
    const codes = read('>abc described\nMK-L\n>d\nMKVL\n', limits).issues.map((issue) => issue.code);
    expect(codes).toContain(code);
  });

  test('names of 10,000 characters or with markup: refused or kept as plain text, shown short', () => {
    const long = read(`>${'n'.repeat(10_000)}\nMKV\n`);
    expect(long.issues.map((issue) => issue.code)).toEqual(['name-too-long']);
    expect(long.issues[0]?.message.length).toBeLessThan(200);
    expect(read('><b>x</b><script>\nMKV\n').value?.rows[0]?.name).toBe('<b>x</b><script>');
  });

  test('at most 200 issues are listed, and the last says how many more there are', () => {
    const { issues } = read(`>a\n${'1'.repeat(500)}\n`);
    expect(issues).toHaveLength(201);
    expect(issues.at(-1)).toMatchObject({ code: 'more-issues', severity: 'error' });
    expect(issues.at(-1)?.message).toMatch(/^300 more problems/);
  });
});
