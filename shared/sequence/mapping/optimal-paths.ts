import { BLOSUM62_LETTERS, BLOSUM62_ROWS } from './blosum62.data';

/** How gaps are charged. A gap of k residues costs openPenalty + extendPenalty · (k − 1). */
export interface GapRules {
  /** Cost of the first residue of a gap, in matrix units; taken to three decimals. */
  openPenalty: number;
  /** Cost of each further residue. */
  extendPenalty: number;
  /** `free`: gaps before the first and after the last pair cost nothing, on both sequences. */
  ends: 'free' | 'global';
  /**
   * Places in `a` where residues are known to be missing: k stands for "between residue k − 1 and k".
   * Among alignments of equal score, one whose gaps in `a` lie there is preferred.
   */
  breaksInA?: readonly number[];
}

/** Steps of a path. A pair takes a residue of both, `onlyA` leaves b behind, `onlyB` leaves a behind. */
export const PAIR = 0;
export const ONLY_A = 1;
export const ONLY_B = 2;

/** All optimal alignments of two sequences as a graph. */
export interface OptimalPaths {
  score: number;
  lengthA: number;
  lengthB: number;
  /**
   * Cell (i, j), at i · (lengthB + 1) + j, has taken i residues of a and j of b. Three bits a step kind
   * (shifted by 3 · kind) say which step kinds may come before, on an optimal way to this cell and kind.
   */
  previous: Uint16Array;
  /** Bits of the step kinds an optimal alignment may end with. */
  last: number;
}

const SCORE_UNIT = 1000;
const UNREACHABLE = -1e15;
const SIZE = BLOSUM62_LETTERS.length;
const UNKNOWN = BLOSUM62_LETTERS.indexOf('X');
/** Letters the matrix lacks are scored as a close relative: selenocysteine, pyrrolysine, Leu or Ile. */
const SCORED_AS: Readonly<Record<string, string>> = { U: 'C', O: 'K', J: 'L' };

function matrixIndices(sequence: string): Uint8Array {
  const indices = new Uint8Array(sequence.length);
  for (let index = 0; index < sequence.length; index += 1) {
    const letter = sequence.charAt(index).toUpperCase();
    const found = BLOSUM62_LETTERS.indexOf(SCORED_AS[letter] ?? letter);
    indices[index] = found === -1 ? UNKNOWN : found;
  }
  return indices;
}

function scaledMatrix(scale: number): Float64Array {
  const scaled = new Float64Array(SIZE * SIZE);
  BLOSUM62_ROWS.forEach((row, a) => row.forEach((score, b) => (scaled[a * SIZE + b] = score * scale)));
  return scaled;
}

/**
 * Fills the affine-gap recursion over all cells and keeps every optimal way, not one.
 * Scores are whole numbers inside, so that ties are exact. Memory: two bytes a cell.
 * Source: Gotoh 1982 JMB 162:705 (three states; a gap in one sequence may follow one in the other).
 */
export function findOptimalPaths(a: string, b: string, rules: GapRules): OptimalPaths {
  const breaks = new Set(rules.breaksInA);
  // A bonus of one per gap at a break can never outweigh a thousandth of a score unit.
  const tieScale = breaks.size + 1;
  const scale = SCORE_UNIT * tieScale;
  const matrix = scaledMatrix(scale);
  const lettersA = matrixIndices(a);
  const lettersB = matrixIndices(b);
  const lengthA = a.length;
  const lengthB = b.length;
  const width = lengthB + 1;
  const open = Math.round(rules.openPenalty * SCORE_UNIT) * tieScale;
  const extend = Math.round(rules.extendPenalty * SCORE_UNIT) * tieScale;
  const free = rules.ends === 'free';
  const previous = new Uint16Array((lengthA + 1) * width);

  // The row above and the row being filled, for each step kind.
  let abovePair = new Float64Array(width).fill(UNREACHABLE);
  let aboveA = new Float64Array(width).fill(UNREACHABLE);
  let aboveB = new Float64Array(width).fill(UNREACHABLE);
  let pair = new Float64Array(width).fill(UNREACHABLE);
  let onlyA = new Float64Array(width).fill(UNREACHABLE);
  let onlyB = new Float64Array(width).fill(UNREACHABLE);

  for (let i = 0; i <= lengthA; i += 1) {
    const atEndOfA = free && (i === 0 || i === lengthA);
    const openB = atEndOfA ? 0 : open - (i > 0 && i < lengthA && breaks.has(i) ? 1 : 0);
    const extendB = atEndOfA ? 0 : extend;
    const matrixRow = i > 0 ? (lettersA[i - 1] as number) * SIZE : 0;
    const base = i * width;
    for (let j = 0; j <= lengthB; j += 1) {
      let bits = 0;
      if (i > 0 && j > 0) {
        const afterPair = abovePair[j - 1] as number;
        const afterA = aboveA[j - 1] as number;
        const afterB = aboveB[j - 1] as number;
        let best = afterPair > afterA ? afterPair : afterA;
        if (afterB > best) best = afterB;
        bits = (afterPair === best ? 1 : 0) | (afterA === best ? 2 : 0) | (afterB === best ? 4 : 0);
        pair[j] = best + (matrix[matrixRow + (lettersB[j - 1] as number)] as number);
      } else pair[j] = i === 0 && j === 0 ? 0 : UNREACHABLE;
      if (i > 0) {
        const atEndOfB = free && (j === 0 || j === lengthB);
        const openA = atEndOfB ? 0 : open;
        const afterPair = (abovePair[j] as number) - openA;
        const afterA = (aboveA[j] as number) - (atEndOfB ? 0 : extend);
        const afterB = (aboveB[j] as number) - openA;
        let best = afterPair > afterA ? afterPair : afterA;
        if (afterB > best) best = afterB;
        bits |= (afterPair === best ? 8 : 0) | (afterA === best ? 16 : 0) | (afterB === best ? 32 : 0);
        onlyA[j] = best;
      } else onlyA[j] = UNREACHABLE;
      if (j > 0) {
        const afterPair = (pair[j - 1] as number) - openB;
        const afterA = (onlyA[j - 1] as number) - openB;
        const afterB = (onlyB[j - 1] as number) - extendB;
        let best = afterPair > afterA ? afterPair : afterA;
        if (afterB > best) best = afterB;
        bits |= (afterPair === best ? 64 : 0) | (afterA === best ? 128 : 0) | (afterB === best ? 256 : 0);
        onlyB[j] = best;
      } else onlyB[j] = UNREACHABLE;
      previous[base + j] = bits;
    }
    [abovePair, pair] = [pair, abovePair];
    [aboveA, onlyA] = [onlyA, aboveA];
    [aboveB, onlyB] = [onlyB, aboveB];
  }

  const endings = [abovePair[lengthB] as number, aboveA[lengthB] as number, aboveB[lengthB] as number];
  const best = Math.max(...endings);
  const last = endings.reduce((bits, ending, kind) => bits | (ending === best ? 1 << kind : 0), 0);
  return { score: Math.floor(best / tieScale) / SCORE_UNIT, lengthA, lengthB, previous, last };
}
