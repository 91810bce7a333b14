import { matchWords, wordsOf } from './words-diff';

export interface JoinedText {
  text: string;
  /** Places that both changed, each in their own way: there stands mine, then theirs. */
  bothChanged: number;
}

const same = (one: readonly string[], other: readonly string[]): boolean => one.join('') === other.join('');

/** Joins two texts that come from a common one: each change is taken, word by word. */
export function joinTexts(base: string, mine: string, theirs: string): JoinedText {
  const [old, own, other] = [wordsOf(base), wordsOf(mine), wordsOf(theirs)];
  const inOther = new Map(matchWords(old, other));
  // Words that all three have in common stand fast; what lies between two of them is joined.
  const fast = matchWords(old, own).flatMap(([at, inOwn]) => {
    const there = inOther.get(at);
    return there === undefined ? [] : [[at, inOwn, there] as const];
  });
  let text = '';
  let bothChanged = 0;
  let from = [0, 0, 0] as [number, number, number];
  for (const [at, inOwn, there] of [...fast, [old.length, own.length, other.length] as const]) {
    const was = old.slice(from[0], at);
    const ours = own.slice(from[1], inOwn);
    const yours = other.slice(from[2], there);
    if (same(ours, was) || same(ours, yours)) text += yours.join('');
    else if (same(yours, was)) text += ours.join('');
    else {
      bothChanged += 1;
      text += inARow(ours.join(''), yours.join(''));
    }
    text += old[at] ?? '';
    from = [at + 1, inOwn + 1, there + 1];
  }
  return { text, bothChanged };
}

/** With a blank between, unless one is there. */
const inARow = (first: string, second: string): string =>
  first === '' || second === '' || /\s$/.test(first) || /^\s/.test(second)
    ? first + second
    : `${first} ${second}`;
