/** A stretch of text: in both, taken out of the old one, or put into the new one. */
export interface DiffPiece {
  kind: 'same' | 'out' | 'in';
  text: string;
}

/** Words, runs of blanks, and single signs, so that a full stop behind a word is not a changed word. */
export const wordsOf = (text: string): string[] => text.match(/\s+|[\p{L}\p{N}_]+|[^\s\p{L}\p{N}_]/gu) ?? [];

/** Pairs of places of the longest run of words that both have in common, in order. */
export function matchWords(one: readonly string[], other: readonly string[]): [number, number][] {
  const width = other.length + 1;
  const lengths = new Uint32Array((one.length + 1) * width);
  const at = (row: number, column: number): number => lengths[row * width + column] ?? 0;
  for (let row = one.length - 1; row >= 0; row -= 1) {
    for (let column = other.length - 1; column >= 0; column -= 1) {
      lengths[row * width + column] =
        one[row] === other[column]
          ? at(row + 1, column + 1) + 1
          : Math.max(at(row + 1, column), at(row, column + 1));
    }
  }
  const pairs: [number, number][] = [];
  let row = 0;
  let column = 0;
  while (row < one.length && column < other.length) {
    if (one[row] === other[column]) {
      pairs.push([row, column]);
      row += 1;
      column += 1;
    } else if (at(row + 1, column) >= at(row, column + 1)) row += 1;
    else column += 1;
  }
  return pairs;
}

/** What was taken out of the old text and put into the new one, word by word. */
export function diffWords(before: string, after: string): DiffPiece[] {
  const old = wordsOf(before);
  const now = wordsOf(after);
  const pieces: DiffPiece[] = [];
  const put = (kind: DiffPiece['kind'], words: readonly string[]) => {
    const text = words.join('');
    if (text === '') return;
    const last = pieces.at(-1);
    if (last?.kind === kind) last.text += text;
    else pieces.push({ kind, text });
  };
  let [fromOld, fromNow] = [0, 0];
  for (const [inOld, inNow] of [...matchWords(old, now), [old.length, now.length] as const]) {
    put('out', old.slice(fromOld, inOld));
    put('in', now.slice(fromNow, inNow));
    put('same', old.slice(inOld, inOld + 1));
    [fromOld, fromNow] = [inOld + 1, inNow + 1];
  }
  return pieces;
}
