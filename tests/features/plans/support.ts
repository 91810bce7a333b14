import type { Protein } from '@/shared/contracts/families';
import type { Construct } from '@/shared/contracts/plans';
import { readFixtureJson, readFixtureText } from '../../support/read-fixture';

/** A protein with a sequence numbering and, if asked, a preferred one with another first number. */
export function buildProtein(residues: string, firstNumber = 1): Protein {
  const segment = { residueIndex: 0, length: residues.length, firstNumber, suffix: '' };
  return {
    id: '018f0000-0000-7000-8000-000000000001',
    familyId: '018f0000-0000-7000-8000-000000000002',
    organism: 'Orvella tarda',
    name: 'c of Orvella tarda',
    length: residues.length,
    version: 1,
    residues,
    numberings: [
      {
        id: '018f0000-0000-7000-8000-000000000003',
        name: 'sequence',
        kind: 'sequence',
        segments: [{ ...segment, firstNumber: 1 }],
      },
      {
        id: '018f0000-0000-7000-8000-000000000004',
        name: 'mature',
        kind: 'offset',
        segments: [segment],
      },
    ],
    preferredNumbering: 'mature',
  };
}

interface PairCase {
  short: string;
  codonNumber: number;
  codonStart0InConstruct: number;
  oldCodon: string;
  newCodon: string;
  complementaryPair?: { forward: string; reverse: string; start0: number; mismatches: number };
}

/** An invented circular construct with worked mutations, computed with Biopython 1.80 (tests/fixtures/README.md). */
export const worked = readFixtureJson<{
  construct: string;
  orfStart0: number;
  orfEnd0_afterStop: number;
  protein: string;
  cases: PairCase[];
}>('mutagenesis-checks.json');

export const workedConstruct: Pick<
  Construct,
  'bases' | 'circular' | 'codingStart' | 'codingLength' | 'encoded' | 'segments'
> = {
  bases: worked.construct,
  circular: true,
  codingStart: worked.orfStart0,
  codingLength: worked.orfEnd0_afterStop - worked.orfStart0,
  encoded: worked.protein,
  segments: [{ codonStart: 0, proteinStart: 0, length: worked.protein.length }],
};

/** Nine coding sequences of the V. cholerae atp operon, GenBank GCF_008369605.1. */
export const operon = readFixtureText('dna/vcholerae_atp_cds.fasta');
