import { readCoding } from '@/shared/sequence/construct/coding';
import { codonOfResidue, matchProtein } from '@/shared/sequence/construct/match-protein';
import { readDna } from '@/shared/sequence/construct/read-dna';
import { makeScenario } from '@/shared/scenario/scenario';
import codonUsage from '@/tests/fixtures/codon-usage.json';
import geneticCodes from '@/tests/fixtures/genetic-codes.json';

const { construct, alignments } = makeScenario();
const row = alignments
  .find((alignment) => alignment.family === construct.family)
  ?.rows.find((candidate) => candidate.organism === construct.organism);
const wildType = row?.residues ?? '';
const shares: Record<string, number> = codonUsage.ecoliK12_fraction;

it('is one DNA record, 1100 to 1400 bases long, half G and C', () => {
  const { value, issues } = readDna(construct.text);
  expect(issues).toEqual([]);
  expect(value?.bases).toBe(construct.bases);
  expect(construct.bases).toMatch(/^[ACGT]{1100,1400}$/);
  const share = construct.bases.replace(/[AT]/g, '').length / construct.bases.length;
  expect(share).toBeGreaterThan(0.47);
  expect(share).toBeLessThan(0.53);
});

it('encodes a tag, then the c subunit from its second residue, then a stop', () => {
  const bases = construct.bases.slice(construct.codingStart, construct.codingStart + construct.codingLength);
  const codons = bases.match(/.../g) ?? [];
  const letters = codons.map(translateByFixture).join('');
  expect(letters).toBe(`${construct.encoded}*`);
  expect(construct.encoded).toMatch(/^MG?H{6}/);
  expect(construct.encoded.endsWith(wildType.slice(1))).toBe(true);
  expect(construct.encoded.length).toBeGreaterThan(wildType.length + 10);
});

it('knows which codon is which residue', () => {
  expect(construct.codons).toHaveLength(construct.codingLength / 3);
  construct.codons.forEach((codon, place) => {
    expect(codon.start).toBe(construct.codingStart + place * 3);
    expect(construct.bases.slice(codon.start, codon.start + 3)).toBe(codon.bases);
    expect(translateByFixture(codon.bases)).toBe(codon.letter);
    if (codon.index !== null) expect(codon.letter).toBe(wildType.charAt(codon.index));
  });
  const indices = construct.codons.flatMap(({ index }) => (index === null ? [] : [index]));
  expect(indices).toEqual(Array.from({ length: wildType.length - 1 }, (_, step) => step + 1));
});

it('is read by the product with that truth', () => {
  const coding = readCoding({
    bases: construct.bases,
    circular: false,
    start: construct.codingStart + 1,
    table: 11,
  });
  expect(coding.issues).toEqual([]);
  expect(coding.value?.length).toBe(construct.codingLength);
  if (!coding.value) throw new Error('not read');
  const match = matchProtein(coding.value, wildType).value;
  expect(match?.tags.flatMap(({ names }) => names)).toEqual([
    'polyhistidine',
    'tobacco etch virus protease site',
  ]);
  for (const [place, { index }] of construct.codons.entries()) {
    if (match && index !== null) expect(codonOfResidue(match, index)).toBe(place);
  }
});

it('uses no rare codon of the host and makes no long run of one base', () => {
  for (const { bases } of construct.codons) {
    expect(shares[bases]).toBeGreaterThanOrEqual(0.1);
  }
  expect(construct.bases).not.toMatch(/(.)\1{4}/);
});

it('has flanks without repeats', () => {
  const flanks = [
    construct.bases.slice(0, construct.codingStart),
    construct.bases.slice(construct.codingStart + construct.codingLength),
  ];
  for (const flank of flanks) {
    expect(flank.length).toBeGreaterThan(300);
    expect(flank).not.toMatch(/(.)\1{3}/);
    const words = Array.from({ length: flank.length - 8 }, (_, start) => flank.slice(start, start + 9));
    expect(new Set(words).size).toBe(words.length);
  }
});

/** By NCBI's table 11, codons in the order T, C, A, G. */
function translateByFixture(codon: string): string {
  const [first = -1, second = -1, third = -1] = [...codon].map((base) => 'TCAG'.indexOf(base));
  return geneticCodes.codes['11'].aminoAcids.charAt(first * 16 + second * 4 + third);
}
