const WORD_LENGTH = 3;

/** The distinct words of three letters in a sequence. */
export function wordsOf(sequence: string): Set<string> {
  const words = new Set<string>();
  for (let index = 0; index + WORD_LENGTH <= sequence.length; index += 1)
    words.add(sequence.slice(index, index + WORD_LENGTH));
  return words;
}

/** How many words two sequences share: a quick measure of how well they may align. */
export function countSharedWords(a: ReadonlySet<string>, b: ReadonlySet<string>): number {
  const [small, large] = a.size < b.size ? [a, b] : [b, a];
  let shared = 0;
  for (const word of small) if (large.has(word)) shared += 1;
  return shared;
}
