import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { columnOfResidue, residueAtColumn } from '@/shared/sequence/alignment/columns';
import { readAlignedFasta } from '@/shared/sequence/alignment/read-fasta';
import { pairsInEveryOptimal } from '@/shared/sequence/mapping/ambiguous-pairs';
import { BLOSUM62_LETTERS, BLOSUM62_ROWS } from '@/shared/sequence/mapping/blosum62.data';
import { alignPair, alignPairWithPaths, type PairAlignment } from '@/shared/sequence/mapping/pairwise';
import { residueIndex } from '@/shared/sequence/positions';

const fixtures = join(__dirname, '../../fixtures');
const json = (file: string) => JSON.parse(readFileSync(join(fixtures, file), 'utf8'));

/** Sequences of an unaligned file, read one by one. */
function sequencesOf(name: string): Map<string, string> {
  const text = readFileSync(join(fixtures, 'sequences', `${name}.fasta`), 'utf8');
  const records = text.split(/^(?=>)/m).flatMap((record) => readAlignedFasta(record).value?.rows ?? []);
  return new Map(records.map((row) => [`${name}/${row.name}`, row.residues]));
}

test('BLOSUM62 equals the published matrix (Henikoff & Henikoff 1992, as distributed by NCBI)', () => {
  const { order, rows } = json('blosum62.json');
  expect(BLOSUM62_LETTERS).toBe(order);
  expect([...order].map((letter: string) => rows[letter])).toEqual(BLOSUM62_ROWS);
});

// Source: Biopython 1.80 PairwiseAligner; ranges over co-optimal alignments.
describe('220 real pairs, ends free, equal a reference library', () => {
  const sequences = new Map(['atp8', 'c_small', 'delta', 'gamma_small'].flatMap((n) => [...sequencesOf(n)]));
  interface Answer {
    score: number;
    identical: [number, number];
    aligned_pairs: [number, number];
    first_blocks: [[number, number][], [number, number][]] | null;
  }
  type Pair = { a: string; b: string; open10_extend1: Answer; open11_extend1: Answer };
  const pairs: Pair[] = json('expected/pairwise.json').pairs;

  test.each([
    ['open10_extend1', 10],
    ['open11_extend1', 11],
  ] as const)('%s', (setting, openPenalty) => {
    expect(pairs).toHaveLength(220);
    for (const pair of pairs) {
      const a = sequences.get(pair.a) ?? '';
      const b = sequences.get(pair.b) ?? '';
      const found = alignPair(a, b, { openPenalty, extendPenalty: 1, ends: 'free' });
      const answer = pair[setting];
      const context = `${pair.a} × ${pair.b}`;
      expect([context, found.score]).toEqual([context, answer.score]);
      expect(found.identical).toBeGreaterThanOrEqual(answer.identical[0]);
      expect(found.identical).toBeLessThanOrEqual(answer.identical[1]);
      expect(found.aligned).toBeGreaterThanOrEqual(answer.aligned_pairs[0]);
      expect(found.aligned).toBeLessThanOrEqual(answer.aligned_pairs[1]);
      expect(found.rows[0].replace(/-/g, '')).toBe(a);
      expect(found.rows[1].replace(/-/g, '')).toBe(b);
      if (answer.first_blocks !== null) expect(pairsOf(found)).toEqual(pairsOfBlocks(answer.first_blocks));
    }
  });
});

function pairsOf(alignment: PairAlignment): string[] {
  return alignment.segments.flatMap((segment) =>
    Array.from({ length: segment.length }, (_, k) => `${segment.aStart + k}:${segment.bStart + k}`),
  );
}

function pairsOfBlocks([a, b]: [[number, number][], [number, number][]]): string[] {
  return a.flatMap(([start, end], block) =>
    Array.from({ length: end - start }, (_, k) => `${start + k}:${(b[block]?.[0] ?? 0) + k}`),
  );
}

// Source: Biopython 1.80, BLOSUM62, first gap residue −10, each further −0.5 (handbook 5, rows 24, 25, 27, 28).
describe('c and a subunits, global and ends free', () => {
  const { sequences, checks } = json('alignment-checks.json');
  interface Check {
    a: string;
    b: string;
    mode: 'global' | 'semi';
    score: number;
    alignedPairs: number;
    identicalPairs: number;
    optimalAlignments: number;
    carboxylate?: { inA: number; mapsToB: number | null };
  }
  const align = (check: Check) =>
    alignPairWithPaths(sequences[check.a], sequences[check.b], {
      openPenalty: 10,
      extendPenalty: 0.5,
      ends: check.mode === 'semi' ? 'free' : 'global',
    });

  test.each((checks as Check[]).map((check) => [`${check.a} × ${check.b}, ${check.mode}`, check] as const))(
    '%s',
    (_, check) => {
      const { alignment, paths } = align(check);
      expect(alignment.score).toBe(check.score);
      expect(alignment.aligned).toBe(check.alignedPairs);
      expect(alignment.identical).toBe(check.identicalPairs);
      const sure = pairsInEveryOptimal(paths);
      if (check.carboxylate !== undefined)
        expect(sure[check.carboxylate.inA - 1]).toBe((check.carboxylate.mapsToB ?? 0) - 1);
      // With one optimal alignment every shown pair is sure; with several, sure pairs are among the shown ones.
      const shown = new Set(pairsOf(alignment));
      const listed = [...sure].flatMap((b, a) => (b === -1 ? [] : [`${a}:${b}`]));
      expect(listed.every((pair) => shown.has(pair))).toBe(true);
      if (check.optimalAlignments === 1) expect(listed).toHaveLength(shown.size);
      else expect(listed.length).toBeLessThan(shown.size);
    },
  );

  test('a cut-out of nine is one gap of nine (row 25)', () => {
    const { alignment } = align({ ...checks[0], a: 'c_ecoli', b: 'c_ecoli_gap38_47', mode: 'semi' });
    expect(alignment.rows[1].match(/-+/g)).toEqual(['-'.repeat(9)]);
    expect(alignment.identical).toBe(70);
  });

  test('a pair lost by every optimal pairwise path is kept by the family alignment (row 28)', () => {
    const rows: Record<string, string> = json('alignment-checks.json').anchoredFamily.rows;
    const text = Object.entries(rows).map(([name, aligned]) => `>${name}\n${aligned}\n`);
    const family = readAlignedFasta(text.join('')).value?.rows ?? [];
    const [ecoli, ilyo] = ['c_ecoli', 'c_ilyo'].map((name) => family.find((row) => row.name === name));
    if (ecoli === undefined || ilyo === undefined) throw new Error('rows are missing');
    const column = columnOfResidue(ecoli, residueIndex(61 - 1));
    expect(column).toBe(64);
    expect(column === null ? null : residueAtColumn(ilyo, column)).toBe(65 - 1);
  });
});
