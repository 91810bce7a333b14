import type { Chain } from '@/shared/structure/types';
import { readPdb } from '@/shared/structure/pdb/read-pdb';
import { atom, bytesOf, read, seqres, trace } from './pdb-lines';

// Source of the rules: PDB format 3.3 (wwPDB, 2012), and the product's own conventions where the format is silent.

function chainsOf(lines: readonly string[]): Chain[] {
  const { value, issues } = read(lines);
  if (!value) throw new Error(issues.map((issue) => issue.message).join(' '));
  return value.chains;
}

function chainOf(lines: readonly string[]): Chain {
  const [chain] = chainsOf(lines);
  if (!chain) throw new Error('no chain');
  return chain;
}

const codes = (lines: readonly string[]): string[] => read(lines).issues.map((issue) => issue.code);
const labels = (chain: Chain): string[] => chain.residues.map((residue) => residue.label);

describe('columns', () => {
  it('reads coordinates that touch as two numbers', () => {
    const line = atom({ x: -100.123, y: -100.456, z: 7 });
    expect(line).toContain('-100.123-100.456');
    const { value } = read([line]);
    expect(value?.atoms.xAngstrom[0]).toBeCloseTo(-100.123, 4);
    expect(value?.atoms.yAngstrom[0]).toBeCloseTo(-100.456, 4);
    expect(value?.atoms.zAngstrom[0]).toBe(7);
  });

  it('reads a chain id and a number of four digits that touch', () => {
    expect(atom({ number: 1000 })).toContain('A1000');
    expect(labels(chainOf([atom({ number: 1000 })]))).toEqual(['1000']);
  });

  it.each([
    ['A000', '10000'],
    ['a000', '1223056'],
    ['-999', '-999'],
    ['   0', '0'],
  ])('reads the residue number %s as %s', (number, label) => {
    expect(labels(chainOf([atom({ number })]))).toEqual([label]);
  });

  it('reads a number of five digits that runs into the column of the insertion code', () => {
    expect(labels(chainOf([atom({ number: '1000', insertion: '5' })]))).toEqual(['10005']);
  });

  it.each(['*****', '186a0', 'A0000', '     '])('never needs the serial number: %s', (serial) => {
    expect(chainOf([atom({ serial })]).observed).toBe('A');
  });

  it('reads a serial number that overflows into the record name', () => {
    const line = `ATOM 1${atom({ serial: '11757' }).slice(6)}`;
    expect(chainOf([line]).observed).toBe('A');
  });

  it('accepts LF, CRLF and CR, and drops a byte-order mark', () => {
    const lines = [...trace('ALA GLY'), 'END'];
    for (const end of ['\n', '\r\n', '\r']) {
      const { value, issues } = readPdb(new TextEncoder().encode(`\ufeff${lines.join(end)}${end}`));
      expect(issues).toEqual([]);
      expect(value?.chains[0]?.observed).toBe('AG');
    }
  });

  it('tells calcium from Cα by residue and column', () => {
    const { value } = read([
      atom({ element: '  ' }),
      'TER',
      atom({ record: 'HETATM', name: 'CA  ', residue: 'CA', number: 2, element: '  ' }),
      atom({ name: 'HG11', residue: 'VAL', number: 3, element: '  ' }),
      atom({ name: 'HG11', residue: 'VAL', number: 4, element: '  ' }),
    ]);
    expect(value?.atoms.elements).toEqual(['C', 'CA', 'H', 'H']);
  });
});

describe('residues', () => {
  it('keeps insertion codes, negative numbers, zero and jumps in file order', () => {
    const lines = [
      atom({ number: -1 }),
      atom({ number: 0 }),
      atom({ number: 52 }),
      atom({ number: 52, insertion: 'B' }),
      atom({ number: 52, insertion: 'A' }),
      atom({ number: 40 }),
    ];
    expect(labels(chainOf(lines))).toEqual(['-1', '0', '52', '52B', '52A', '40']);
  });

  it('keeps a blank chain id, and tells upper from lower case', () => {
    const lines = [...trace('ALA', ' '), ...trace('GLY', 'a'), ...trace('SER', 'A'), ...trace('CYS', '1')];
    expect(chainsOf(lines).map((chain) => [chain.id, chain.observed])).toEqual([
      [' ', 'A'],
      ['a', 'G'],
      ['A', 'S'],
      ['1', 'C'],
    ]);
  });

  it('prints X for UNK alone, and lists what has no known parent as a ligand, with a warning', () => {
    const lines = [
      ...trace('ALA UNK'),
      atom({ record: 'HETATM', residue: 'Q9Z', number: 3 }),
      ...trace('GLY', 'A', 4),
      'TER',
    ];
    const chain = chainOf(lines);
    expect(chain.observed).toBe('AXG');
    expect(chain.ligands).toMatchObject([{ name: 'Q9Z', label: '3' }]);
    expect(read(lines).issues).toMatchObject([
      { code: 'unknown-parent', severity: 'warning', line: 3, chain: 'A', residue: '3' },
    ]);
  });

  it('takes the parent from MODRES before any table', () => {
    const modres = [
      'MODRES 0XXX Q9Z A    2  LYS  SOMETHING NEW',
      'MODRES 0XXX MSE A    3  LEU  A STRANGE STATEMENT',
    ];
    const chain = chainOf([...modres, ...seqres('A', 'ALA Q9Z MSE'), ...trace('ALA Q9Z MSE'), 'TER']);
    expect(chain.observed).toBe('AKL');
    expect(chain.declared).toBe('AKL');
    expect(chain.residues[1]).toMatchObject({ name: 'Q9Z', parent: 'LYS' });
  });

  it('leaves caps out of the declared sequence and lists them as ligands, without a warning', () => {
    const cap = (residue: string, number: number): string => atom({ record: 'HETATM', residue, number });
    const lines = [
      ...seqres('A', 'ACE ALA GLY NH2'),
      cap('ACE', 0),
      ...trace('ALA GLY'),
      cap('NH2', 3),
      'TER',
    ];
    expect(chainOf(lines)).toMatchObject({ declared: 'AG', observed: 'AG' });
    expect(chainOf(lines).ligands.map((ligand) => ligand.name)).toEqual(['ACE', 'NH2']);
    expect(codes(lines)).toEqual([]);
  });

  it('knows nucleotides, old and new names', () => {
    const chain = chainOf(trace('DA DC G U DT A'));
    expect(chain).toMatchObject({ kind: 'nucleic', observed: 'ACGUTA' });
  });

  it('counts waters apart from ligands, wherever they stand', () => {
    const lines = [
      ...trace('ALA'),
      atom({ record: 'HETATM', residue: 'HOH', number: 1, name: ' O  ' }),
      'TER',
      atom({ record: 'HETATM', residue: 'DOD', number: 300, name: ' O  ' }),
      atom({ record: 'HETATM', residue: ' MG', number: 301, name: 'MG  ' }),
    ];
    expect(chainOf(lines)).toMatchObject({
      observed: 'A',
      waters: 2,
      ligands: [{ name: 'MG', label: '301' }],
    });
  });
});

describe('alternates', () => {
  it('keeps for each atom the position of the highest occupancy, the first on ties', () => {
    const at = (name: string, alternate: string, occupancy: string, x: number): string =>
      atom({ name, alternate, occupancy, x });
    const { value } = read([
      at(' CA ', 'A', '  0.40', 1),
      at(' CA ', 'B', '  0.60', 2),
      at(' CB ', 'A', '  0.50', 3),
      at(' CB ', 'B', '  0.50', 4),
      at(' CG ', 'A', '  0.60', 5),
      at(' CG ', 'B', '  0.40', 6),
      at(' N  ', ' ', '  1.00', 7),
    ]);
    expect(Array.from(value?.atoms.xAngstrom ?? [])).toEqual([2, 3, 5, 7]);
    expect(value?.chains[0]?.residues[0]).toMatchObject({ atomCount: 4, alternates: 3 });
  });

  it('finds them in separate blocks too', () => {
    const first = trace('ALA GLY', 'A', 1, { alternate: 'A', occupancy: '  0.30' });
    const second = trace('ALA GLY', 'A', 1, { alternate: 'B', occupancy: '  0.70', x: 9 });
    const { value, issues } = read([...first, ...second]);
    expect(issues).toEqual([]);
    expect(value?.chains[0]?.residues.map((residue) => residue.alternates)).toEqual([1, 1]);
    expect(Array.from(value?.atoms.xAngstrom ?? [])).toEqual([9, 9]);
  });

  it('keeps the first of two residue kinds at one place, with a warning', () => {
    const lines = [
      atom({ residue: 'SER', alternate: 'A', occupancy: '  0.30' }),
      atom({ residue: 'GLY', alternate: 'B', occupancy: '  0.70', x: 9 }),
    ];
    expect(chainOf(lines)).toMatchObject({ observed: 'S' });
    expect(read(lines).value?.atoms.count).toBe(1);
    expect(read(lines).issues).toMatchObject([
      { code: 'microheterogeneity', line: 2, chain: 'A', residue: '1' },
    ]);
  });

  it('keeps occupancy 0, with a warning', () => {
    const lines = [atom({ occupancy: '  0.00' })];
    expect(chainOf(lines).observed).toBe('A');
    expect(read(lines).issues).toMatchObject([{ code: 'occupancy-zero', line: 1, column: 55, residue: '1' }]);
  });

  it('keeps the first of an atom written twice, with a warning', () => {
    const { value, issues } = read([atom({ x: 1 }), atom({ x: 2 })]);
    expect(Array.from(value?.atoms.xAngstrom ?? [])).toEqual([1]);
    expect(issues).toMatchObject([{ code: 'duplicate-atom', line: 2 }]);
  });
});

describe('the end of a chain', () => {
  const free = atom({ record: 'HETATM', residue: 'GLU', number: 4, x: 50 });

  it('takes HETATM before TER as part of the polymer', () => {
    const chain = chainOf([
      ...trace('ALA'),
      atom({ record: 'HETATM', residue: 'MSE', number: 2 }),
      ...trace('GLY', 'A', 3),
      'TER',
    ]);
    expect(chain.observed).toBe('AMG');
  });

  it('takes a free amino acid after TER as a ligand', () => {
    const chain = chainOf([...trace('ALA GLY SER'), 'TER', free]);
    expect(chain).toMatchObject({ observed: 'AGS', ligands: [{ name: 'GLU', label: '4' }] });
  });

  it('takes it as a residue where SEQRES has a place for it', () => {
    const chain = chainOf([...seqres('A', 'ALA GLY SER GLU'), ...trace('ALA GLY SER'), 'TER', free]);
    expect(chain).toMatchObject({ observed: 'AGSE', ligands: [] });
    expect(chain.residues[3]).toMatchObject({ label: '4', declaredIndex: 3 });
  });

  it('leaves it a ligand where SEQRES has another residue there, or none', () => {
    for (const declared of ['ALA GLY SER CYS', 'ALA GLY SER']) {
      const chain = chainOf([...seqres('A', declared), ...trace('ALA GLY SER'), 'TER', free]);
      expect(chain).toMatchObject({ observed: 'AGS', ligands: [{ name: 'GLU', label: '4' }] });
    }
  });

  it('takes one that is written as ATOM as a ligand too, with a warning, when it stands alone', () => {
    const lines = [...trace('ALA GLY SER'), 'TER', ...trace('GLU', 'A', 20)];
    expect(chainOf(lines)).toMatchObject({ observed: 'AGS', ligands: [{ name: 'GLU', label: '20' }] });
    expect(read(lines).issues).toMatchObject([{ code: 'free-residue', line: 5, chain: 'A', residue: '20' }]);
  });

  it('goes on with a chain that comes back after its TER, as one chain', () => {
    const lines = [
      ...trace('ALA GLY'),
      'TER',
      ...trace('SER', 'B'),
      'TER',
      ...trace('CYS VAL', 'A', 5),
      'TER',
    ];
    expect(chainsOf(lines).map((chain) => [chain.id, chain.observed])).toEqual([
      ['A', 'AGCV'],
      ['B', 'S'],
    ]);
    expect(codes(lines)).toEqual(['chain-continues']);
  });

  it('gives ligands and waters that follow all chains to the chain whose id they carry', () => {
    const ligand = atom({ record: 'HETATM', residue: 'ATP', number: 9, chain: 'A' });
    const water = atom({ record: 'HETATM', residue: 'HOH', number: 10, chain: 'B', name: ' O  ' });
    const lines = [...trace('ALA'), 'TER       2      ALA A   1', ...trace('GLY', 'B'), 'TER', ligand, water];
    expect(chainsOf(lines)).toMatchObject([
      { id: 'A', ligands: [{ name: 'ATP' }], waters: 0 },
      { id: 'B', ligands: [], waters: 1 },
    ]);
    expect(codes(lines)).toEqual([]);
  });

  it('lets a ligand after TER carry the number of a residue', () => {
    const chain = chainOf([
      ...trace('ALA GLY'),
      'TER',
      atom({ record: 'HETATM', residue: 'ATP', number: 1 }),
    ]);
    expect(chain).toMatchObject({ observed: 'AG', ligands: [{ name: 'ATP', label: '1' }] });
  });
});

describe('models', () => {
  const lines = [
    'MODEL        3',
    ...trace('ALA'),
    'ENDMDL',
    'MODEL        7',
    ...trace('GLY SER'),
    'ENDMDL',
  ];

  it('reads the first unless asked, and counts all', () => {
    expect(read(lines).value).toMatchObject({ modelCount: 2, modelNumber: 3, chains: [{ observed: 'A' }] });
    expect(read(lines, { model: 7 }).value).toMatchObject({
      modelCount: 2,
      modelNumber: 7,
      chains: [{ observed: 'GS' }],
    });
  });

  it('says which there are when the wanted one is missing', () => {
    const { value, issues } = read(lines, { model: 2 });
    expect(value).toBeNull();
    expect(issues).toMatchObject([{ code: 'model-not-found', severity: 'error' }]);
    expect(issues[0]?.message).toContain('3, 7');
  });

  it('stops at END and says that atoms follow', () => {
    const { value, issues } = readPdb(bytesOf(...trace('ALA'), 'END', ...trace('GLY', 'B')));
    expect(value?.chains).toHaveLength(1);
    expect(issues).toMatchObject([{ code: 'after-end', line: 3 }]);
  });
});

describe('declared against observed', () => {
  it('places residues by the list of missing ones, negative numbers and insertion codes included', () => {
    const missing = [
      'REMARK 465   M RES C SSSEQI',
      'REMARK 465     MET A    -1',
      'REMARK 465     GLY A    10A',
    ];
    const seen = [...trace('ALA', 'A', 0), ...trace('GLY', 'A', 10), ...trace('GLY', 'A', 11)];
    const chain = chainOf([...missing, ...seqres('A', 'MET ALA GLY GLY GLY'), ...seen]);
    expect(chain.missing).toEqual(['-1', '10A']);
    expect(chain.residues.map((residue) => residue.declaredIndex)).toEqual([1, 2, 4]);
  });

  it('keeps only the missing residues of the model that is read', () => {
    const remark = [
      'REMARK 465   M RES C SSSEQI',
      'REMARK 465   1 MET A     1',
      'REMARK 465   2 ALA A     2',
    ];
    const models = [
      'MODEL        1',
      ...trace('ALA', 'A', 2),
      'ENDMDL',
      'MODEL        2',
      ...trace('MET'),
      'ENDMDL',
    ];
    const lines = [...remark, ...seqres('A', 'MET ALA'), ...models];
    expect(read(lines).value?.chains[0]).toMatchObject({ missing: ['1'], residues: [{ declaredIndex: 1 }] });
    expect(read(lines, { model: 2 }).value?.chains[0]).toMatchObject({
      missing: ['2'],
      residues: [{ declaredIndex: 0 }],
    });
  });

  it('opens a gap where the chain is broken, without a list of missing residues', () => {
    const declared = 'MET ALA GLY SER ALA GLY SER LYS';
    const seen = [...trace('ALA GLY', 'A', 2), ...trace('GLY SER LYS', 'A', 6)];
    const chain = chainOf([...seqres('A', declared), ...seen]);
    expect(chain.residues.map((residue) => residue.declaredIndex)).toEqual([1, 2, 5, 6, 7]);
    expect(chain.missing).toEqual([]);
  });

  it('opens none where it is not broken: a residue that differs is told', () => {
    const lines = [...seqres('A', 'ALA GLY SER LYS VAL'), ...trace('ALA GLY CYS LYS VAL')];
    expect(chainOf(lines).residues.map((residue) => residue.declaredIndex)).toEqual([0, 1, 2, 3, 4]);
    expect(read(lines).issues).toMatchObject([
      { code: 'declared-differs', line: 4, chain: 'A', residue: '3' },
    ]);
  });

  it('opens none where it is not broken, even if a gap would fit better', () => {
    const lines = [...seqres('A', 'ALA GLY SER LYS VAL TRP'), ...trace('ALA GLY LYS VAL TRP')];
    expect(chainOf(lines).residues.map((residue) => residue.declaredIndex)).toEqual([1, 2, 3, 4, 5]);
    expect(codes(lines)).toEqual(['declared-differs', 'declared-differs']);
  });

  it('leaves without a place what stands before the declared sequence', () => {
    const lines = [...seqres('A', 'ALA GLY SER LYS'), ...trace('HIS HIS ALA GLY SER LYS')];
    expect(chainOf(lines).residues.map((residue) => residue.declaredIndex)).toEqual([
      undefined,
      undefined,
      0,
      1,
      2,
      3,
    ]);
    expect(codes(lines)).toEqual(['not-declared', 'not-declared']);
  });

  it('warns of a SEQRES that does not hold as many residues as it says, and of a chain nobody sees', () => {
    const lines = ['SEQRES   1 A    3  ALA GLY', ...seqres('B', 'ALA'), ...trace('ALA GLY')];
    expect(read(lines).issues).toMatchObject([
      { code: 'declared-length', line: 1, chain: 'A' },
      { code: 'chain-without-coordinates', chain: 'B' },
    ]);
  });
});
