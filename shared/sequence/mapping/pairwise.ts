import { compareLetters } from '../alphabet';
import { findOptimalPaths, ONLY_A, ONLY_B, PAIR, type GapRules, type OptimalPaths } from './optimal-paths';

export type { GapRules };

/** A run of pairs: residues aStart … of `a` beside residues bStart … of `b`, all from 0. */
export interface PairSegment {
  aStart: number;
  bStart: number;
  length: number;
}

export interface PairAlignment {
  /** In units of BLOSUM62 (half bits). */
  score: number;
  /** Pairs of equal letters; pairs with B, Z, J or X never count. */
  identical: number;
  /** Pairs of which neither letter is B, Z, J or X: the denominator of `identity`. */
  determined: number;
  /** All pairs. */
  aligned: number;
  /** identical ÷ determined; 0 without pairs. */
  identity: number;
  /** Both sequences with `-` where the other has a residue alone. */
  rows: [string, string];
  segments: PairSegment[];
}

/** Gap costs used for a chain and its protein [common practice, handbook of the field; no source]. */
export const DEFAULT_GAP_RULES: GapRules = { openPenalty: 10, extendPenalty: 0.5, ends: 'free' };

/** Two bytes a cell are kept; more cells than this should not be asked for. */
export const MAX_PAIR_CELLS = 50_000_000;

/** Whether aligning two sequences of these lengths stays within the memory a worker has. */
export function fitsInMemory(lengthA: number, lengthB: number, maxCells = MAX_PAIR_CELLS): boolean {
  return (lengthA + 1) * (lengthB + 1) <= maxCells;
}

/** The steps of one optimal alignment, last first: a pair if it can be one, else a gap in a, else a gap in b. */
function traceSteps(paths: OptimalPaths): Uint8Array {
  const steps = new Uint8Array(paths.lengthA + paths.lengthB);
  const width = paths.lengthB + 1;
  const choose = (bits: number) => ((bits & 1) !== 0 ? PAIR : (bits & 4) !== 0 ? ONLY_B : ONLY_A);
  let i = paths.lengthA;
  let j = paths.lengthB;
  let kind = choose(paths.last);
  let count = 0;
  while (i > 0 || j > 0) {
    steps[count] = kind;
    count += 1;
    const bits = ((paths.previous[i * width + j] ?? 0) >> (3 * kind)) & 7;
    if (kind !== ONLY_B) i -= 1;
    if (kind !== ONLY_A) j -= 1;
    kind = choose(bits);
  }
  return steps.subarray(0, count).reverse();
}

/** Counts and rows that follow from the pairs of two sequences. */
function describe(a: string, b: string, steps: Uint8Array, score: number): PairAlignment {
  const segments: PairSegment[] = [];
  const rowA: string[] = [];
  const rowB: string[] = [];
  let i = 0;
  let j = 0;
  let identical = 0;
  let determined = 0;
  let aligned = 0;
  let open: PairSegment | null = null;
  for (const kind of steps) {
    if (kind !== PAIR) open = null;
    else {
      if (open === null) segments.push((open = { aStart: i, bStart: j, length: 0 }));
      open.length += 1;
      aligned += 1;
      const relation = compareLetters(a.charAt(i), b.charAt(j));
      if (relation !== 'undetermined') determined += 1;
      if (relation === 'identical') identical += 1;
    }
    rowA.push(kind === ONLY_B ? '-' : a.charAt(i));
    rowB.push(kind === ONLY_A ? '-' : b.charAt(j));
    if (kind !== ONLY_B) i += 1;
    if (kind !== ONLY_A) j += 1;
  }
  const identity = determined === 0 ? 0 : identical / determined;
  return { score, identical, determined, aligned, identity, rows: [rowA.join(''), rowB.join('')], segments };
}

/**
 * One optimal alignment of two ungapped protein sequences with affine gaps and BLOSUM62 (U scores as C,
 * O as K, J as L, anything unknown as X). Either may be empty. Check `fitsInMemory` first for sequences
 * whose length a person chose. Ties: a pair before a gap in `a` before a gap in `b`, from the far end;
 * gaps in `a` at its breaks before others.
 * Sources: Gotoh 1982 JMB 162:705; Henikoff & Henikoff 1992 PNAS 89:10915.
 */
export function alignPair(a: string, b: string, rules: GapRules = DEFAULT_GAP_RULES): PairAlignment {
  const paths = findOptimalPaths(a, b, rules);
  return describe(a, b, traceSteps(paths), paths.score);
}

/** As alignPair, with the graph of all optimal alignments for `pairsInEveryOptimal`. */
export function alignPairWithPaths(
  a: string,
  b: string,
  rules: GapRules = DEFAULT_GAP_RULES,
): { alignment: PairAlignment; paths: OptimalPaths } {
  const paths = findOptimalPaths(a, b, rules);
  return { alignment: describe(a, b, traceSteps(paths), paths.score), paths };
}
