import hybrid36 from '@/tests/fixtures/hybrid36-checks.json';
import { readPdb } from '@/shared/structure/pdb/read-pdb';
import { decodeHybrid36, encodeHybrid36 } from '@/shared/structure/pdb/hybrid-36';
import type { Chain, StructureModel } from '@/shared/structure/types';
import { structureBytes } from '@/tests/support/structure-fixtures';

/*
 * Values read or counted in the entries themselves (1COW: van Raaij et al. 1996 PNAS 93:6913; 4BEM: Matthies et al.
 * 2014 Nat Commun 5:5286).
 */
const head = readPdb(structureBytes('1cow.pdb')).value as StructureModel;
const ring = readPdb(structureBytes('4bem.pdb')).value as StructureModel;
const chainOf = (model: StructureModel, id: string): Chain =>
  model.chains.find((chain) => chain.id === id) as Chain;

it('reads the DBREF row of 1COW chain D', () => {
  expect(chainOf(head, 'D').references).toEqual([
    { begin: '-3', end: '478', database: 'UNP', accession: 'P00829', databaseBegin: 47, databaseEnd: 528 },
  ]);
});

it('counts precursor numbers from DBREF: β 188 is Glu 238, β −3 is 47, α 373 is 416, γ 1 is 26', () => {
  const precursor = (id: string, label: number): number => {
    const [row] = chainOf(head, id).references;
    if (!row) throw new Error(`no DBREF of chain ${id}`);
    return label - Number(row.begin) + row.databaseBegin;
  };
  expect(precursor('D', 188)).toBe(238);
  expect(chainOf(head, 'D').residues.find((residue) => residue.label === '188')?.letter).toBe('E');
  expect(precursor('D', -3)).toBe(47);
  expect(precursor('A', 373)).toBe(416);
  expect(precursor('G', 1)).toBe(26);
});

it('finds 272 declared and 122 observed residues in 1COW chain G, with breaks 44→77 and 90→209', () => {
  const gamma = chainOf(head, 'G');
  expect(gamma.declared).toHaveLength(272);
  expect(gamma.residues).toHaveLength(122);
  const numbers = gamma.residues.map((residue) => residue.authorNumber);
  const breaks = numbers.flatMap((number, index) => {
    const next = numbers[index + 1];
    return next !== undefined && next !== number + 1 ? [[number, next]] : [];
  });
  expect(breaks).toEqual([
    [44, 77],
    [90, 209],
  ]);
  // Here author numbers are precursor numbers less 25, so they count along the declared chain from 1.
  expect(gamma.residues.map((residue) => residue.declaredIndex)).toEqual(numbers.map((number) => number - 1));
});

it.each([
  ['A', 510, 487, 23],
  ['B', 510, 487, 23],
  ['C', 510, 492, 18],
  ['D', 482, 467, 15],
  ['E', 482, 466, 16],
  ['F', 482, 466, 16],
])(
  'finds in 1COW chain %s %i declared, %i observed, %i missing residues',
  (id, declared, observed, missing) => {
    const chain = chainOf(head, id);
    expect(chain.declared).toHaveLength(declared);
    expect(chain.residues).toHaveLength(observed);
    expect(chain.missing).toHaveLength(missing);
  },
);

it('lists the missing residues of 1COW chain D', () => {
  const labels = ['-3', '-2', '-1', '0', '1', '2', '3', '4', '5', '6', '7', '8', '476', '477', '478'];
  expect(chainOf(head, 'D').missing).toEqual(labels);
});

it('takes FME 1 of 4BEM chain J into the polymer, as M, though it is written HETATM', () => {
  expect(chainOf(ring, 'J').residues[0]).toMatchObject({
    label: '1',
    name: 'FME',
    letter: 'M',
    parent: 'MET',
    declaredIndex: 0,
  });
});

it('counts MSE as M', () => {
  const model = readPdb(structureBytes('2oxl.pdb')).value as StructureModel;
  const residue = chainOf(model, 'A').residues.find((candidate) => candidate.label === '42');
  expect(residue).toMatchObject({ name: 'MSE', letter: 'M', parent: 'MET' });
});

it('reads the difference that SEQADV of 2JKH names', () => {
  const model = readPdb(structureBytes('2jkh.pdb')).value as StructureModel;
  expect(chainOf(model, 'A').differences).toEqual([
    {
      label: '150',
      residueName: 'GLU',
      databaseResidue: 'ARG',
      databaseNumber: '372',
      comment: 'ENGINEERED MUTATION',
    },
  ]);
});

it('joins DBREF1 and DBREF2 of 6F37', () => {
  const model = readPdb(structureBytes('6f37.pdb')).value as StructureModel;
  expect(chainOf(model, 'B').references[1]).toEqual({
    begin: '2',
    end: '90',
    database: 'UNP',
    accession: 'A0A0S4TLR1',
    databaseBegin: 3,
    databaseEnd: 91,
  });
});

// Source: the open description of hybrid-36 by R. W. Grosse-Kunstleve; values computed from it.
describe.each([
  [5, hybrid36.width5],
  [4, hybrid36.width4],
])('hybrid-36 in %i columns', (width, rows) => {
  it.each(Object.entries(rows))('writes %s as %s and reads it back', (number, field) => {
    expect(decodeHybrid36(field, width)).toBe(Number(number));
    expect(encodeHybrid36(Number(number), width)).toBe(field);
  });
});
