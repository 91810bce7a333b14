import fc from 'fast-check';
import { readPdb } from '@/shared/structure/pdb/read-pdb';
import {
  writePdb,
  type PdbWriteAtom,
  type PdbWriteInput,
  type PdbWriteResidue,
} from '@/shared/structure/pdb/write-pdb';
import { residueLabel } from '@/shared/structure/draft';

/** Columns of an atom line and of a DBREF row. Source: PDB format 3.3 (wwPDB, 2012). */
it('puts each field in the columns of the format', () => {
  const { value } = writePdb({
    title: 'A TITLE',
    remarks: ['Computed from ideal geometry.'],
    chains: [
      {
        id: 'K',
        declared: ['MSE', 'GLU'],
        dbref: [
          {
            begin: '-4',
            end: '52A',
            database: 'UNP',
            accession: 'X00001',
            databaseBegin: 1,
            databaseEnd: 57,
          },
        ],
        differences: [
          {
            label: '-4',
            residueName: 'MSE',
            databaseResidue: 'MET',
            databaseNumber: '1',
            comment: 'MODIFIED RESIDUE',
          },
        ],
        missing: [{ name: 'GLU', number: 52, insertionCode: 'A' }],
        residues: [
          {
            number: -4,
            name: 'MSE',
            hetero: true,
            atoms: [
              {
                name: 'SE',
                element: 'SE',
                x: -100.123,
                y: -100.456,
                z: 7,
                occupancy: 0.5,
                bFactor: 12.5,
                alternate: 'A',
              },
            ],
          },
        ],
        ligands: [{ number: 201, name: 'MG', atoms: [{ name: 'MG', element: 'MG', x: 1, y: 2, z: 3 }] }],
      },
    ],
  });
  expect(value?.split('\n').map((line) => line.trimEnd())).toEqual([
    'TITLE     A TITLE',
    'REMARK 999 Computed from ideal geometry.',
    'REMARK 465',
    'REMARK 465 DECLARED RESIDUES WITHOUT COORDINATES',
    'REMARK 465',
    'REMARK 465   M RES C SSSEQI',
    'REMARK 465     GLU K    52A',
    'DBREF       K   -4    52A UNP    X00001                    1     57',
    'SEQADV      MSE K   -4  UNP  X00001    MET     1 MODIFIED RESIDUE',
    'SEQRES   1 K    2  MSE GLU',
    'MODRES      MSE K   -4  MET',
    'HETATM    1 SE  AMSE K  -4    -100.123-100.456   7.000  0.50 12.50          SE',
    'TER       2      MSE K  -4',
    'HETATM    3 MG    MG K 201       1.000   2.000   3.000  1.00  0.00          MG',
    'END',
    '',
  ]);
  expect(
    value
      ?.split('\n')
      .slice(0, -1)
      .every((line) => line.length === 80),
  ).toBe(true);
});

it('refuses what does not fit the columns, and chains of one id', () => {
  const write = (change: Partial<PdbWriteAtom>): string[] =>
    writePdb({
      title: '',
      chains: [
        {
          id: 'A',
          declared: [],
          residues: [
            { number: 1, name: 'ALA', atoms: [{ name: 'CA', element: 'C', x: 0, y: 0, z: 0, ...change }] },
          ],
        },
      ],
    }).issues.map((issue) => issue.code);
  expect(write({})).toEqual([]);
  expect(write({ x: 12345.678 })).toEqual(['field-too-narrow']);
  expect(write({ y: NaN })).toEqual(['not-a-number']);
  expect(write({ name: 'ALONG' })).toEqual(['field-too-narrow']);
  const twice = { id: 'A', declared: [], residues: [] };
  expect(writePdb({ title: '', chains: [twice, twice] })).toMatchObject({
    value: null,
    issues: [{ code: 'chain-twice' }],
  });
});

const STANDARD = 'ALA ARG ASN ASP CYS GLN GLU GLY HIS ILE LEU LYS MET PHE PRO SER THR TRP TYR VAL'.split(' ');
const coordinate = fc.integer({ min: -999_999, max: 9_999_999 }).map((thousandths) => thousandths / 1000);
const word = fc.string({ unit: fc.constantFrom(...'ABCXYZ019()'), minLength: 1, maxLength: 12 });
const atoms = fc
  .uniqueArray(fc.constantFrom('N', 'CA', 'C', 'O', 'CB', 'HD11', 'OXT'), { minLength: 1 })
  .chain((names) =>
    fc.tuple(
      ...names.map((name) =>
        fc.record({ name: fc.constant(name), x: coordinate, y: coordinate, z: coordinate }),
      ),
    ),
  )
  .map((rows): PdbWriteAtom[] => rows.map((row) => ({ ...row, element: row.name.charAt(0) })));

/** A declared chain with some residues unseen, numbered upwards from anywhere, with insertion codes. */
const chain = fc
  .record({
    names: fc.array(fc.constantFrom(...STANDARD, 'MSE', 'FME'), { minLength: 1, maxLength: 40 }),
    first: fc.integer({ min: -999, max: 12_000 }),
    steps: fc.array(fc.constantFrom('next', 'jump', 'insert'), { minLength: 40, maxLength: 40 }),
    seen: fc.array(fc.boolean(), { minLength: 40, maxLength: 40 }),
    atoms: fc.array(atoms, { minLength: 40, maxLength: 40 }),
    accession: fc.constantFrom('X00001', 'A0A0X0XXX1'),
    comment: fc.constantFrom('ENGINEERED MUTATION', 'EXPRESSION TAG'),
    waters: fc.integer({ min: 0, max: 3 }),
  })
  .map(({ names, first, steps, seen, atoms: lists, accession, comment, waters }) => {
    let number = first;
    let insertion = 0;
    const all = names.map((name, index): PdbWriteResidue => {
      if (index > 0 && steps[index] === 'insert' && insertion < 26) insertion++;
      else if (index > 0) {
        number += steps[index] === 'jump' ? 7 : 1;
        insertion = 0;
      }
      const insertionCode = insertion > 0 ? String.fromCharCode(64 + insertion) : '';
      return {
        number,
        insertionCode,
        name,
        hetero: name.length > 0 && !STANDARD.includes(name),
        atoms: lists[index] ?? [],
      };
    });
    const isSeen = (index: number): boolean => index === 0 || seen[index] === true;
    const label = residueLabel(first, '');
    return {
      declared: names,
      residues: all.filter((_, index) => isSeen(index)),
      missing: all.filter((_, index) => !isSeen(index)),
      dbref: [{ begin: label, end: label, database: 'UNP', accession, databaseBegin: 3, databaseEnd: 900 }],
      differences: [
        { label, residueName: names[0] ?? '', databaseResidue: 'GLY', databaseNumber: '3', comment },
      ],
      ligands: Array.from({ length: waters }, (_, index) => ({
        number: 9000 + index,
        name: 'HOH',
        atoms: [{ name: 'O', element: 'O', x: index, y: 0, z: 0 }],
      })),
    };
  });

const input = fc
  .record({
    title: fc.array(word, { maxLength: 30 }),
    chains: fc.array(chain, { minLength: 1, maxLength: 4 }),
  })
  .map(({ title, chains }): PdbWriteInput => ({
    title: title.join(' '),
    chains: chains.map((one, index) => ({ id: 'A b0'.charAt(index), ...one })),
  }));

it('is read back as it was written', () => {
  fc.assert(
    fc.property(input, (written) => {
      const { value: text, issues } = writePdb(written);
      expect(issues).toEqual([]);
      const { value: model, issues: readIssues } = readPdb(new TextEncoder().encode(text ?? ''));
      expect(readIssues).toEqual([]);
      if (!model) throw new Error('not read');
      expect(model.title).toBe(written.title);
      expect(model.chains.map((one) => one.id)).toEqual(written.chains.map((one) => one.id));
      for (const [index, from] of written.chains.entries()) {
        const to = model.chains[index];
        if (!to) throw new Error('no chain');
        const kept = to.residues.map((residue) => ({
          number: residue.authorNumber,
          insertionCode: residue.insertionCode,
          name: residue.name,
          hetero: residue.parent !== undefined,
          atoms: Array.from({ length: residue.atomCount }, (_, offset): PdbWriteAtom => {
            const at = residue.atomStart + offset;
            const rounded = (values: Float32Array): number => Math.round((values[at] ?? NaN) * 1000) / 1000;
            return {
              name: model.atoms.names[at] ?? '',
              x: rounded(model.atoms.xAngstrom),
              y: rounded(model.atoms.yAngstrom),
              z: rounded(model.atoms.zAngstrom),
              element: model.atoms.elements[at] ?? '',
            };
          }),
        }));
        expect(kept).toEqual(from.residues);
        const missing = (from.missing ?? []).map((row) => residueLabel(row.number, row.insertionCode ?? ''));
        expect(to.missing).toEqual(missing);
        expect(to.declared).toHaveLength(from.declared.length);
        const places = to.residues.map((residue) => from.declared[residue.declaredIndex ?? -1]);
        expect(places).toEqual(from.residues.map((residue) => residue.name));
        expect(to.references).toEqual(from.dbref);
        expect(to.differences).toEqual(from.differences);
        expect(to.waters).toBe(from.ligands?.length);
      }
    }),
    { numRuns: 150 },
  );
});
