import { createHash } from 'node:crypto';
import { chooseCodons } from '@/shared/sequence/construct/codon-choice';
import { ECOLI_CODON_SHARES, YEAST_CODON_SHARES } from '@/shared/sequence/construct/codon-usage.data';
import {
  codonsOf,
  GENETIC_CODE_IDS,
  isStartCodon,
  translate,
  translateCodon,
} from '@/shared/sequence/construct/genetic-code';
import { readDnaRecords } from '@/shared/sequence/construct/read-dna';
import { readFixtureJson, readFixtureText } from '../../support/read-fixture';

// NCBI translation tables as shipped in Biopython 1.80.
const ncbi = readFixtureJson<{
  codes: Record<string, { aminoAcids: string; starts: string[]; stops: string[] }>;
}>('genetic-codes.json');
// Biopython 1.80, Seq.translate, whole codons, stop as `*`, no start-codon rule.
const expected = readFixtureJson<{
  files: {
    file: string;
    joined_sha256: Record<string, string>;
    entries: { name: string; nt: number; translations: Record<string, string> }[];
  }[];
}>('expected/translate.json').files.find(({ file }) => file === 'vcholerae_atp_cds.fasta');
const records = readDnaRecords(readFixtureText('dna/vcholerae_atp_cds.fasta')).value ?? [];

const BASES = 'TCAG';
const CODONS = [...BASES].flatMap((first) =>
  [...BASES].flatMap((second) => [...BASES].map((third) => first + second + third)),
);

describe.each([...GENETIC_CODE_IDS])('genetic code %d', (id) => {
  const table = ncbi.codes[String(id)];

  test('reads all 64 codons as NCBI has them', () => {
    expect(CODONS.map((codon) => translateCodon(codon, id)).join('')).toBe(table?.aminoAcids);
    expect(translate(CODONS.join(''), id)).toBe(table?.aminoAcids);
    expect([...codonsOf('*', id)].sort()).toEqual(table?.stops);
    expect(CODONS.filter((codon) => isStartCodon(codon, id)).sort()).toEqual(
      [...(table?.starts ?? [])].sort(),
    );
  });

  test('translates the nine coding sequences of the V. cholerae atp operon', () => {
    expect(records).toHaveLength(9);
    const proteins = records.map(({ bases }) => translate(bases, id));
    expect(proteins).toEqual(expected?.entries.map(({ translations }) => translations[String(id)]));
    expect(createHash('sha256').update(proteins.join('\n')).digest('hex')).toBe(
      expected?.joined_sha256[String(id)],
    );
  });
});

// Acceptance row 44 of the handbook.
test('TGA, AGA, CTG and ATA in codes 1, 2 and 3', () => {
  const read = (id: 1 | 2 | 3) => translate('TGAAGACTGATA', id);
  expect([read(1), read(2), read(3)]).toEqual(['*RLI', 'W*LM', 'WRTM']);
});

test('codon shares are those of the Kazusa database', () => {
  const usage = readFixtureJson<{
    ecoliK12_fraction: Record<string, number>;
    scerevisiae_fraction: Record<string, number>;
  }>('codon-usage.json');
  expect(ECOLI_CODON_SHARES).toEqual(usage.ecoliK12_fraction);
  expect(YEAST_CODON_SHARES).toEqual(usage.scerevisiae_fraction);
});

test('Asp GAT to Asn: AAT has the fewest changes, AAC the host prefers (handbook 9.3)', () => {
  const choice = chooseCodons({ codonFrom: 'GAT', to: 'N', table: 11, host: 'ecoli' }).value;
  expect(choice?.fewest).toMatchObject({ codon: 'AAT', changedBases: 1, share: 0.45 });
  expect(choice?.host).toMatchObject({ codon: 'AAC', changedBases: 2, share: 0.55 });
});
