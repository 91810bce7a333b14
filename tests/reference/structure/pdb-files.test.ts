import type { Chain, ChainResidue, StructureModel } from '@/shared/structure/types';
import { readPdb } from '@/shared/structure/pdb/read-pdb';
import { expectedStructure, structureBytes, structureFiles } from '@/tests/support/structure-fixtures';

/*
 * Source: Biopython 1.80 (PDBParser, first model, one position an atom), run on the same files; the settings are in
 * the source field of each answer. Where it counts otherwise than this product, the rule is stated at the check.
 */
describe.each(structureFiles)('%s is read as an outside library reads it', (file) => {
  const expected = expectedStructure(file);
  const { value, issues } = readPdb(structureBytes(file));
  const model = value as StructureModel;

  it('is usable', () => {
    expect(value).not.toBeNull();
    expect(issues.filter((issue) => issue.severity === 'error')).toEqual([]);
  });

  it('has the same models and chains, in file order', () => {
    expect(model.modelCount).toBe(expected.models);
    expect(model.chains.map((chain) => chain.id)).toEqual(expected.chains.map((chain) => chain.id));
  });

  describe.each(expected.chains)('chain $id', (answer) => {
    const chain = model.chains.find((candidate) => candidate.id === answer.id) as Chain;

    it('has the observed sequence, author numbers and insertion codes', () => {
      expect(chain.observed).toBe(answer.sequence);
      expect(chain.residues).toHaveLength(answer.residues_observed_sequence);
      // The answer lists at most 700 numbers; no chain here is longer.
      expect(chain.residues.map((residue) => residue.label)).toEqual(answer.numbers);
      const inserted = chain.residues.filter((residue) => residue.insertionCode !== '');
      expect(inserted.map((residue) => residue.label)).toEqual(answer.insertion_coded);
    });

    it('has the same modified residues, ligands, waters and kept atoms', () => {
      const modified = chain.residues.filter((residue) => residue.parent !== undefined);
      expect(modified.map((residue) => [residue.name, residue.label])).toEqual(answer.modified);
      // "hetero" there is everything written HETATM but water: here, modified residues are residues.
      const ligands = answer.hetero.filter(([name, label]) => !isListed(answer.modified, name, label));
      expect(chain.ligands.map((ligand) => [ligand.name, ligand.label])).toEqual(ligands);
      expect(chain.waters).toBe(answer.waters);
      expect(chain.residues.length + chain.ligands.length + chain.waters).toBe(answer.residues_total);
    });

    it('has as many atoms with alternate positions', () => {
      const alternates = chain.residues.reduce((sum, residue) => sum + residue.alternates, 0);
      expect(alternates).toBe(answer.disordered_atoms);
    });

    it('has the same declared sequence', () => {
      // Caps are "-" there and left out here.
      const declared = expected.raw.seqres[answer.id]?.sequence.replaceAll('-', '') ?? null;
      expect(chain.declared).toBe(declared);
    });
  });

  it('keeps the same atoms', () => {
    const atoms = expected.chains.reduce((sum, chain) => sum + chain.atoms_one_position, 0);
    expect(model.atoms.count).toBe(atoms);
  });

  it('has the same DBREF, MODRES and REMARK 465 rows', () => {
    const references = model.chains.flatMap((chain) =>
      chain.references.map((row) => [
        chain.id,
        row.begin,
        row.end,
        row.accession,
        row.databaseBegin,
        row.databaseEnd,
      ]),
    );
    // The answer names the rows of DBREF alone, with the entry name that is not kept here.
    for (const [id, begin, end, , accession, , first, last] of expected.raw.dbref) {
      expect(references).toContainEqual([id, begin, end, accession, Number(first), Number(last)]);
    }
    for (const [name, id, label, parent] of expected.raw.modres) {
      const chain = model.chains.find((candidate) => candidate.id === id);
      expect(chain?.residues.find((residue) => residue.label === label)).toMatchObject({ name, parent });
    }
    expect(model.chains.reduce((sum, chain) => sum + chain.missing.length, 0)).toBe(expected.raw.remark465);
  });

  it('places every observed residue of a chain with SEQRES, so that missing and observed make it up', () => {
    for (const chain of model.chains) {
      if (chain.declared === null) continue;
      const places = chain.residues.map((residue) => residue.declaredIndex);
      const letters = places.map((place) => (place === undefined ? '?' : chain.declared?.[place])).join('');
      expect(letters).toBe(chain.observed);
      expect(places).toEqual([...new Set(places)].sort((a, b) => Number(a) - Number(b)));
      expect(chain.residues.length + chain.missing.length).toBe(chain.declared.length);
    }
  });

  it('has the coordinates of the same kept positions: closest distances between chains agree to 0.002 Å', () => {
    for (const { chains, closest } of expected.contacts_4A) {
      const [a, b] = chains.map((id) => model.chains.find((chain) => chain.id === id) as Chain) as [
        Chain,
        Chain,
      ];
      for (const [first, second, angstrom, polymer] of closest) {
        if (polymer === 0) continue;
        const distance = closestHeavyAtoms(model, residueNamed(a, first), residueNamed(b, second));
        expect(Math.abs(distance - angstrom)).toBeLessThan(0.002);
      }
    }
  });
});

function isListed(list: readonly [string, string][], name: string, label: string): boolean {
  return list.some(([listedName, listedLabel]) => listedName === name && listedLabel === label);
}

function residueNamed(chain: Chain, nameAndLabel: string): ChainResidue {
  const found = chain.residues.find((residue) => residue.name + residue.label === nameAndLabel);
  if (!found) throw new Error(`${chain.id} has no ${nameAndLabel}`);
  return found;
}

function closestHeavyAtoms({ atoms }: StructureModel, a: ChainResidue, b: ChainResidue): number {
  let closest = Infinity;
  for (let i = a.atomStart; i < a.atomStart + a.atomCount; i++) {
    for (let j = b.atomStart; j < b.atomStart + b.atomCount; j++) {
      if (atoms.elements[i] === 'H' || atoms.elements[j] === 'H') continue;
      const dx = (atoms.xAngstrom[i] ?? NaN) - (atoms.xAngstrom[j] ?? NaN);
      const dy = (atoms.yAngstrom[i] ?? NaN) - (atoms.yAngstrom[j] ?? NaN);
      const dz = (atoms.zAngstrom[i] ?? NaN) - (atoms.zAngstrom[j] ?? NaN);
      closest = Math.min(closest, Math.hypot(dx, dy, dz));
    }
  }
  return closest;
}
