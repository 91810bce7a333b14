import { gzipSync } from 'node:zlib';
import fc from 'fast-check';
import { readPdb } from '@/shared/structure/pdb/read-pdb';
import { structureBytes, structureFiles } from '@/tests/support/structure-fixtures';
import { atom, bytesOf, read, seqres, trace } from './pdb-lines';

const text = (content: string): Uint8Array => new TextEncoder().encode(content);
const refusals: [what: string, bytes: Uint8Array, code: string][] = [
  ['an empty file', new Uint8Array(0), 'empty'],
  ['blank lines', text('\n   \n\r\n'), 'empty'],
  ['a file with NUL bytes', text('HEADER\nATOM\0\0\n'), 'binary'],
  ['a picture', Uint8Array.of(0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a, 0, 0, 0, 13), 'binary'],
  ['a gzip file', new Uint8Array(gzipSync(structureBytes('disordered.pdb'))), 'wrong-kind'],
  ['FASTA', text('>a\nMKLV\n>b\nMK-V\n'), 'wrong-kind'],
  ['Stockholm', text('# STOCKHOLM 1.0\na MKLV\n//\n'), 'wrong-kind'],
  [
    'alignment blocks',
    text('multiple sequence alignment\n\na  MKLVMKLVMKLV\nb  MK-VMKLVMKLV\n'),
    'wrong-kind',
  ],
  ['mmCIF', text('data_X\nloop_\n_atom_site.id\n1\n'), 'wrong-kind'],
  ['a web page', text('<!DOCTYPE html>\n<html></html>\n'), 'wrong-kind'],
  ['prose', text('Dear colleague,\nplease find attached.\n'), 'wrong-kind'],
  ['a header without atoms', bytesOf('HEADER    A', 'TITLE     NOTHING', 'END'), 'no-atoms'],
  ['atoms without numbers', bytesOf(atom().replace('0.000   0.000', 'x.yz0   0.000'), 'END'), 'no-atoms'],
  ['water only', bytesOf(atom({ record: 'HETATM', residue: 'HOH' }), 'END'), 'no-polymer'],
];

it.each(refusals)('refuses %s with one error', (_, bytes, code) => {
  const { value, issues } = readPdb(bytes);
  expect(value).toBeNull();
  expect(issues.filter((issue) => issue.severity === 'error').map((issue) => issue.code)).toEqual([code]);
  expect(issues.every((issue) => issue.message.length > 10)).toBe(true);
});

describe('limits', () => {
  const lines = [...trace('ALA GLY SER'), ...trace('ALA', 'B')];
  it.each([
    ['bytes', { bytes: 100 }, 'too-many-bytes'],
    ['atoms', { atoms: 3 }, 'too-many-atoms'],
    ['chains', { chains: 1 }, 'too-many-chains'],
    ['header rows', { headerEntries: 4 }, 'too-many-header-rows'],
  ])('refuses more %s than allowed', (_, limits, code) => {
    const { value, issues } = read([...seqres('A', 'ALA GLY SER VAL LEU'), ...lines], { limits });
    expect(value).toBeNull();
    expect(issues.map((issue) => issue.code)).toContain(code);
  });

  it('refuses more models than allowed', () => {
    const models = ['MODEL        1', ...lines, 'ENDMDL', 'MODEL        2', ...lines, 'ENDMDL'];
    expect(read(models, { limits: { models: 1 } }).issues).toMatchObject([
      { code: 'too-many-models', line: 7 },
    ]);
    expect(read(models, { limits: { models: 2 } }).value?.modelCount).toBe(2);
  });

  it('lists so many issues of a kind and counts the rest', () => {
    const bad = Array.from({ length: 50 }, (_, index) => atom({ number: index + 2 }).slice(0, 40));
    const { value, issues } = read([...trace('ALA'), ...bad], { limits: { issuesPerCode: 5 } });
    expect(value?.chains[0]?.observed).toBe('A');
    expect(issues).toHaveLength(6);
    expect(issues[0]).toMatchObject({ code: 'line-truncated', severity: 'warning', line: 2, column: 41 });
    expect(issues[5]).toEqual({
      code: 'line-truncated',
      severity: 'warning',
      message: '45 more of this kind (50 in all).',
    });
  });

  it('says so when a chain is too long to be compared with its SEQRES', () => {
    const broken = [...trace('ALA GLY'), ...trace('SER', 'A', 9)];
    const { value, issues } = read([...seqres('A', 'ALA GLY VAL SER'), ...broken], {
      limits: { placementCells: 11 },
    });
    expect(value?.chains[0]?.observed).toBe('AGS');
    expect(issues).toMatchObject([{ code: 'declared-not-compared', chain: 'A' }]);
  });
});

describe('lines that cannot be read', () => {
  it.each([
    ['x', 31],
    ['y', 39],
    ['z', 47],
  ])('names the column of a bad %s', (_, column) => {
    const good = atom({ number: 2 });
    const bad = `${good.slice(0, column - 1)}  1.2 34${good.slice(column + 7)}`;
    expect(read([atom(), bad]).issues).toMatchObject([{ code: 'bad-coordinate', line: 2, column }]);
  });

  it('names a bad residue number and a bad occupancy', () => {
    const { value, issues } = read([
      atom(),
      atom({ number: '1x' }),
      atom({ number: 2, occupancy: ' 1..00' }),
    ]);
    expect(value?.chains[0]?.residues.map((residue) => residue.label)).toEqual(['1', '2']);
    expect(issues).toMatchObject([
      { code: 'bad-residue-number', line: 2, column: 23 },
      { code: 'bad-occupancy', line: 3, column: 55 },
    ]);
  });

  it('reads a line that ends after its coordinates', () => {
    const { value, issues } = read([atom().slice(0, 54)]);
    expect(value?.atoms).toMatchObject({ count: 1, elements: ['C'] });
    expect(issues).toEqual([]);
  });

  it('warns of a chain whose residues nobody knows, and reads the others', () => {
    const lines = [...trace('ALA GLY'), 'TER', ...trace('UNK UNK', 'B'), 'TER', ...trace('Q9Z', 'C'), 'TER'];
    const { value, issues } = read(lines);
    expect(value?.chains.map((chain) => [chain.id, chain.kind, chain.observed])).toEqual([
      ['A', 'protein', 'AG'],
      ['B', 'protein', 'XX'],
      ['C', 'other', ''],
    ]);
    const unknown = issues.filter((issue) => issue.code === 'chain-without-sequence');
    expect(unknown.map((issue) => issue.chain)).toEqual(['B', 'C']);
  });
});

describe('whatever happens to a real file', () => {
  const SECONDS_ALLOWED = 2;

  function readInTime(bytes: Uint8Array): ReturnType<typeof readPdb> {
    const begun = performance.now();
    const result = readPdb(bytes);
    expect((performance.now() - begun) / 1000).toBeLessThan(SECONDS_ALLOWED);
    if (result.value === null) expect(result.issues.some((issue) => issue.severity === 'error')).toBe(true);
    return result;
  }

  const anyFile = fc.constantFrom(...structureFiles.filter((name) => name !== '1cow.pdb'));

  it('cut off anywhere, it is read as far as it goes, with a warning, or refused', () => {
    fc.assert(
      fc.property(anyFile, fc.double({ min: 0, max: 1, noNaN: true }), (file, part) => {
        const bytes = structureBytes(file);
        const cut = bytes.subarray(0, Math.floor(part * (bytes.length - 90)));
        const { value, issues } = readInTime(cut);
        if (value) expect(issues.some((issue) => issue.code === 'no-end')).toBe(true);
      }),
      { numRuns: 150 },
    );
  });

  it('with bytes changed, lines doubled, moved or dropped, it never throws and is quick', () => {
    const change = fc.record({
      at: fc.double({ min: 0, max: 1, noNaN: true }),
      byte: fc.integer({ min: 1, max: 255 }),
      length: fc.integer({ min: 0, max: 400 }),
      how: fc.constantFrom('set', 'drop', 'double', 'fill' as const),
    });
    fc.assert(
      fc.property(anyFile, fc.array(change, { minLength: 1, maxLength: 30 }), (file, changes) => {
        let bytes = structureBytes(file);
        for (const { at, byte, length, how } of changes) {
          const from = Math.floor(at * bytes.length);
          const to = Math.min(bytes.length, from + length);
          if (how === 'set') bytes[from] = byte;
          else if (how === 'fill') bytes.fill(byte, from, to);
          else
            bytes = joined(
              bytes.subarray(0, how === 'drop' ? from : to),
              bytes.subarray(how === 'drop' ? to : from),
            );
        }
        readInTime(bytes);
      }),
      { numRuns: 200 },
    );
  });

  it('made of records with random columns, it never throws and is quick', () => {
    const record = fc.constantFrom(
      ...[
        'ATOM  ',
        'HETATM',
        'TER   ',
        'MODEL ',
        'ENDMDL',
        'SEQRES',
        'MODRES',
        'DBREF ',
        'DBREF1',
        'DBREF2',
        'SEQADV',
      ],
      'REMARK 465',
      'REMARK 465   M RES C SSSEQI',
    );
    const filling = fc.string({ unit: fc.constantFrom(...' 0123456789.-ABCZalo'), maxLength: 74 });
    fc.assert(
      fc.property(fc.array(fc.tuple(record, filling), { maxLength: 60 }), (lines) => {
        readInTime(bytesOf('HEADER', ...lines.map(([name, rest]) => name + rest)));
      }),
      { numRuns: 300 },
    );
  });

  it('built to be slow, it is not: one huge residue, two that take turns, thousands of free ones', () => {
    const count = 60_000;
    const name = (index: number): string => index.toString(36).padStart(4, '0');
    const huge = Array.from({ length: count }, (_, index) => atom({ name: name(index) }));
    const turns = Array.from({ length: count }, (_, index) =>
      atom({ name: name(index), number: 1 + (index % 2) }),
    );
    const free = Array.from({ length: 9_000 }, (_, index) =>
      atom({ record: 'HETATM', residue: 'GLU', number: index }),
    );
    const declared = seqres('A', Array.from({ length: 9_000 }, () => 'GLU').join(' '));
    expect(readInTime(bytesOf(...huge)).value?.atoms.count).toBe(count);
    expect(readInTime(bytesOf(...turns)).value?.atoms.count).toBe(count);
    expect(readInTime(bytesOf(...declared, ...trace('ALA ALA'), 'TER', ...free)).value).not.toBeNull();
    expect(
      readInTime(bytesOf(...declared, ...free.map((line) => line.replace('HETATM', 'ATOM  ')))).value,
    ).not.toBeNull();
  });
});

function joined(a: Uint8Array, b: Uint8Array): Uint8Array {
  const both = new Uint8Array(a.length + b.length);
  both.set(a);
  both.set(b, a.length);
  return both;
}
