import { reverseComplement } from '@/shared/sequence/construct/bases';
import { readCoding, type Coding } from '@/shared/sequence/construct/coding';
import { findProtein } from '@/shared/sequence/construct/find-protein';
import { codonOfResidue, matchProtein } from '@/shared/sequence/construct/match-protein';
import { residueIndex } from '@/shared/sequence/positions';
import { readFixtureJson } from '../../../support/read-fixture';

const file = readFixtureJson<{ construct: string; orfStart0: number; protein: string }>(
  'mutagenesis-checks.json',
);
const gene = file.construct.slice(file.orfStart0, file.orfStart0 + 240);
const PROTEIN = file.protein;

function codingOf(bases: string, start = 1): Coding {
  const { value, issues } = readCoding({ bases, circular: false, start, table: 11 });
  if (value === null) throw new Error(issues.map(({ message }) => message).join(' '));
  return value;
}

test('a construct that encodes the protein itself', () => {
  const { value, issues } = matchProtein(codingOf(gene), PROTEIN);
  expect(issues).toEqual([]);
  expect(value).toMatchObject({
    segments: [{ codon: 0, residueIndex: 0, length: 79 }],
    tags: [],
    offset: 0,
    mismatches: [],
    identity: 1,
    coverage: 1,
  });
});

test('a tag before the protein shifts the codons and is named', () => {
  // Met, six His, a protease site, then the protein without its Met.
  const tagged = `ATG${'CAC'.repeat(6)}GAAAACCTGTATTTTCAGGGC${gene.slice(3)}`;
  const { value, issues } = matchProtein(codingOf(tagged), PROTEIN);
  expect(issues).toEqual([]);
  expect(value?.tags).toEqual([
    { end: 'N', residues: 'MHHHHHHENLYFQG', names: ['polyhistidine', 'tobacco etch virus protease site'] },
  ]);
  expect(value?.segments).toEqual([{ codon: 14, residueIndex: 1, length: 78 }]);
  expect(value?.offset).toBe(-13);
  const asp = value ? codonOfResidue(value, residueIndex(60)) : null;
  expect(asp).toBe(73);
  expect(codingOf(tagged).protein.charAt(asp ?? -1)).toBe('D');
  expect(value ? codonOfResidue(value, residueIndex(0)) : 0).toBeNull();
});

test('a tag behind the protein', () => {
  const tagged = `${gene.slice(0, -3)}${'CAT'.repeat(8)}TAA`;
  const { value } = matchProtein(codingOf(tagged), PROTEIN);
  expect(value?.tags).toEqual([{ end: 'C', residues: 'HHHHHHHH', names: ['polyhistidine'] }]);
  expect(value?.offset).toBe(0);
});

test('a residue that differs is listed with its base', () => {
  const mutant = `${gene.slice(0, 180)}AAC${gene.slice(183)}`;
  const { value, issues } = matchProtein(codingOf(mutant), PROTEIN);
  expect(value?.mismatches).toEqual([
    { codon: 60, residueIndex: 60, base: 180, encoded: 'N', expected: 'D' },
  ]);
  expect(issues).toEqual([
    expect.objectContaining({ code: 'encoded-mismatch', severity: 'warning', residue: '61' }),
  ]);
  expect(issues[0]?.message).toContain('base 181');
});

test('a lost base: the best match and the base and residue where it breaks', () => {
  // The 151st base is gone: codon 51 (Q) is the first that reads otherwise.
  const shifted = `${gene.slice(0, 150)}${gene.slice(151)}GCATGA`;
  const coding = readCoding({ bases: shifted, circular: false, start: 1, table: 11 }).value;
  expect(coding?.protein.slice(0, 50)).toBe(PROTEIN.slice(0, 50));
  const { value, issues } = matchProtein(coding as Coding, PROTEIN);
  expect(value).toBeNull();
  expect(issues).toHaveLength(1);
  const broken = [...PROTEIN].findIndex((letter, index) => letter !== coding?.protein[index]);
  expect(broken).toBeGreaterThanOrEqual(50);
  expect(issues[0]).toMatchObject({
    code: 'protein-not-encoded',
    severity: 'error',
    residue: String(broken + 1),
  });
  expect(issues[0]?.message).toContain(`base ${3 * broken + 1}`);
});

test('another frame: the place where the protein stands is told', () => {
  const wrong = readCoding({ bases: file.construct, circular: true, start: 2, table: 11 }).value as Coding;
  const { value, issues } = matchProtein(wrong, PROTEIN, { bases: file.construct });
  expect(value).toBeNull();
  expect(issues[0]?.message).toContain('from base 53 on the strand as given');
});

test('a protein is found on both strands and across the origin', () => {
  const turned = file.construct.slice(100) + file.construct.slice(0, 100);
  expect(findProtein(turned, true, PROTEIN, 11)).toEqual([
    { strand: '+', start: file.construct.length - 100 + file.orfStart0 },
  ]);
  expect(findProtein(turned, false, PROTEIN, 11)).toEqual([]);
  const flipped = reverseComplement(file.construct);
  expect(findProtein(flipped, false, PROTEIN, 11)).toEqual([
    { strand: '-', start: flipped.length - 1 - file.orfStart0 },
  ]);
});

test('an unrelated or empty protein is refused', () => {
  expect(matchProtein(codingOf(gene), '').issues[0]?.code).toBe('protein-empty');
  expect(matchProtein(codingOf(gene), 'WWWWWHHHHHCCCCCWWWWW').issues[0]?.code).toBe('protein-not-encoded');
});

test('a stop inside is where the protein breaks off: the base it follows is told', () => {
  const at = 3 * 30;
  const stopped = `${gene.slice(0, at)}TAA${gene.slice(at + 3)}`;
  const { value, issues } = matchProtein(codingOf(stopped), PROTEIN, { bases: stopped });
  expect(value).toBeNull();
  expect(issues[0]).toMatchObject({ code: 'protein-not-encoded', residue: '31' });
  expect(issues[0]?.message).toContain(
    `breaks at residue 31 (${PROTEIN.charAt(30)}), where a stop follows base ${at}.`,
  );
});

test('DNA that is cut off says where it ends', () => {
  const cut = gene.slice(0, 3 * 30);
  const { issues } = matchProtein(codingOf(cut), PROTEIN, { bases: cut });
  expect(issues[0]?.message).toContain('where the DNA ends at base 90.');
});
