import { columnOfResidue, residueAtColumn } from '@/shared/sequence/alignment/columns';
import { readAlignedFasta } from '@/shared/sequence/alignment/read-fasta';
import { labelOfResidue, offsetNumbering, residueOfLabel } from '@/shared/sequence/numbering/numbering';
import { residueIndex } from '@/shared/sequence/positions';
import { readPdb } from '@/shared/structure/pdb/read-pdb';
import { landmarks, sequences } from '@/tests/support/landmarks';
import { readFixtureJson } from '@/tests/support/read-fixture';
import { structureBytes } from '@/tests/support/structure-fixtures';

const FILE_NAMES: Record<string, string> = {
  bov_a: 'bovine_alpha_1BMF',
  bov_b: 'bovine_beta_1BMF_truncated',
};

// Source: published landmark numbers (evidence in each row of landmarks.json); letters read in the sequences.
const held = landmarks.filter((one) => one.sequence !== null && one.sequenceIndex1 !== null);
test.each(held.map((one) => [`${one.system} ${one.family} ${one.aminoAcid}${one.label}`, one] as const))(
  '%s stands where its published number says, by an offset numbering',
  (_, { sequence, sequenceIndex1, aminoAcid, label }) => {
    if (sequence === null || sequenceIndex1 === null) throw new Error('not held');
    const residues = sequences[sequence] ?? sequences[FILE_NAMES[sequence] ?? ''] ?? '';
    const numbering = offsetNumbering(residues.length, label - sequenceIndex1);
    const residue = residueOfLabel(numbering, String(label));
    expect(residue).toBe(sequenceIndex1 - 1);
    expect(residues.charAt(residue ?? -1)).toBe(aminoAcid);
    expect(residue === null ? null : labelOfResidue(numbering, residue)).toBe(String(label));
  },
);

test('the list of held landmarks is not empty', () => {
  expect(held.length).toBeGreaterThan(30);
});

test('through the family alignment E. coli c Asp61 is each organism’s own carboxylate', () => {
  const { rows } = readFixtureJson<{ anchoredFamily: { rows: Record<string, string> } }>(
    'alignment-checks.json',
  ).anchoredFamily;
  const text = Object.entries(rows).map(([name, aligned]) => `>${name}\n${aligned}\n`);
  const family = readAlignedFasta(text.join('')).value?.rows ?? [];
  const ecoli = family.find((row) => row.name === 'c_ecoli');
  const column = ecoli === undefined ? null : columnOfResidue(ecoli, residueIndex(60));
  if (column === null) throw new Error('Asp61 has no column');
  const found = family.map((row) => {
    const residue = residueAtColumn(row, column);
    return [row.name, residue === null ? null : residue + 1, residue === null ? null : row.residues[residue]];
  });
  const carboxylates = held.filter((one) => one.site === 'membrane carboxylate');
  const expected = carboxylates.map((one) => [one.sequence, one.label, one.aminoAcid]);
  expect(expected).toHaveLength(8);
  expect(found.sort()).toEqual(expected.sort());
});

// Handbook, rows 8 and 9 of its acceptance checks; the offsets are read in the DBREF records of the file.
test('1COW: author numbers to precursor numbers by the file’s own references', () => {
  const { value } = readPdb(structureBytes('1cow.pdb'));
  const precursorOf = (chainId: string, label: string) => {
    const chain = value?.chains.find((candidate) => candidate.id === chainId);
    const reference = chain?.references[0];
    if (chain === undefined || reference === undefined) throw new Error(`no chain ${chainId}`);
    const mature = offsetNumbering(reference.databaseEnd, Number(reference.begin) - reference.databaseBegin);
    const letter = chain.residues.find((residue) => residue.label === label)?.letter;
    return [Number(residueOfLabel(mature, label)) + 1, letter];
  };
  expect(precursorOf('D', '188')).toEqual([238, 'E']);
  expect(precursorOf('D', '-3')).toEqual([47, undefined]);
  expect(precursorOf('A', '373')).toEqual([416, 'R']);
  expect(precursorOf('G', '1')).toEqual([26, 'A']);
});
