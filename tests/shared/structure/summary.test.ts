import { readPdb } from '@/shared/structure/pdb/read-pdb';
import { summariseStructure } from '@/shared/structure/summary';
import { atom, read, seqres, trace } from './pdb/pdb-lines';
import { structureBytes } from '@/tests/support/structure-fixtures';

it('has exactly the fields that the structure command prints', () => {
  const ligand = atom({ record: 'HETATM', residue: 'ATP', number: 9 });
  const water = atom({ record: 'HETATM', residue: 'HOH', number: 10, name: ' O  ' });
  const { value } = read([...seqres('A', 'GLY MSE'), ...trace('MSE', 'A', 2), 'TER', ligand, water]);
  if (!value) throw new Error('not read');
  expect(summariseStructure(value)).toEqual({
    format: 'pdb',
    models: 1,
    chains: [
      {
        id: 'A',
        labelIds: [],
        kind: 'protein',
        declared: 'GM',
        observed: 'M',
        residues: [{ label: '2', name: 'MSE', letter: 'M', parent: 'MET', atoms: 1, alternates: 0 }],
        ligands: [{ name: 'ATP', label: '9' }],
        waters: 1,
      },
    ],
    atoms: 3,
  });
});

it('holds the atoms of every residue of a real file', () => {
  const model = readPdb(structureBytes('2jkh.pdb')).value;
  if (!model) throw new Error('not read');
  const summary = summariseStructure(model);
  expect(summary.atoms).toBe(model.atoms.count);
  expect(JSON.parse(JSON.stringify(summary))).toEqual(summary);
});
