import type { DeclaredSequence, ObservedResidue, Placement } from './place-declared';

// Method choice, no source: only their order matters. A mismatch costs more than a gap at a break.
const MATCH = 2;
const MISMATCH = -2;
const GAP = -1;
/** Given back when the numbers jump by as much as the gap is long. */
const NUMBERS_AGREE = 1;

const START = 0;
const NEXT = 1;
const JUMP = 2;
const NUMBERED_JUMP = 3;

/**
 * Places observed residues in a declared sequence by an alignment whose gaps may open only at the ends and where
 * `isLinked(i)` says that residue i is not bonded to the one before it. `cells` bounds the table; null above it.
 */
export function alignToDeclared(
  observed: readonly ObservedResidue[],
  declared: DeclaredSequence,
  isLinked: (index: number) => boolean,
  cells: number,
): Placement | null {
  const rows = observed.length;
  const columns = declared.names.length;
  if (rows === 0 || columns === 0 || rows * columns > cells) return null;
  const trace = new Uint8Array(rows * columns);
  const jumps = new Map<number, Int32Array>();
  let previous = new Float64Array(columns);
  let best = { score: -Infinity, row: 0, column: 0 };
  for (let row = 0; row < rows; row++) {
    const current = new Float64Array(columns);
    const broken = row > 0 && !isLinked(row);
    const from = broken ? bestBefore(previous) : undefined;
    if (from) jumps.set(row, from);
    const step = numberStep(observed, row);
    for (let column = 0; column < columns; column++) {
      let score = row === 0 || column === 0 ? 0 : -Infinity;
      let code = START;
      // A residue whose neighbour has no place may begin anew only at the free ends: row 0 or column 0.
      if (row > 0 && column > 0 && (previous[column - 1] ?? 0) > score) {
        score = previous[column - 1] ?? 0;
        code = NEXT;
      }
      if (from && column > 1) {
        const numbered = step > 1 ? (previous[column - step] ?? -Infinity) + GAP + NUMBERS_AGREE : -Infinity;
        if (numbered > score) {
          score = numbered;
          code = NUMBERED_JUMP;
        }
        const jump = (previous[from[column - 1] ?? 0] ?? 0) + GAP;
        if (jump > score) {
          score = jump;
          code = JUMP;
        }
      }
      current[column] = score + fit(observed[row], declared, column);
      trace[row * columns + column] = code;
    }
    const last = row === rows - 1;
    for (let column = last ? 0 : columns - 1; column < columns; column++) {
      const score = current[column] ?? 0;
      if (score > best.score) best = { score, row, column };
    }
    previous = current;
  }
  return walkBack(best, trace, columns, jumps, observed);
}

function fit(residue: ObservedResidue | undefined, declared: DeclaredSequence, column: number): number {
  if (!residue) return 0;
  if (residue.name === declared.names[column]) return MATCH;
  const letter = declared.letters[column];
  if (residue.letter === 'X' || letter === 'X') return 0;
  return residue.letter === letter ? MATCH : MISMATCH;
}

/** How far the author number moves from the residue before. */
function numberStep(observed: readonly ObservedResidue[], row: number): number {
  return (observed[row]?.authorNumber ?? 0) - (observed[row - 1]?.authorNumber ?? 0);
}

/** For each column c: the column before c where the row scores highest, the nearest on ties. */
function bestBefore(row: Float64Array): Int32Array {
  const from = new Int32Array(row.length);
  let best = 0;
  for (let column = 0; column < row.length; column++) {
    from[column] = best;
    if ((row[column] ?? 0) >= (row[best] ?? 0)) best = column;
  }
  return from;
}

function walkBack(
  end: { row: number; column: number },
  trace: Uint8Array,
  columns: number,
  jumps: Map<number, Int32Array>,
  observed: readonly ObservedResidue[],
): Placement {
  const placement: Placement = new Array<number | undefined>(observed.length).fill(undefined);
  let { row, column } = end;
  while (row >= 0) {
    placement[row] = column;
    const code = trace[row * columns + column];
    if (code === START) break;
    if (code === NEXT) column -= 1;
    else if (code === NUMBERED_JUMP) column -= numberStep(observed, row);
    else column = jumps.get(row)?.[column - 1] ?? 0;
    row -= 1;
  }
  return placement;
}
