function isStrong(base: string): boolean {
  return base === 'G' || base === 'C';
}

/** G and C among the bases, 0–1; 0 for an empty text. */
export function gcFraction(bases: string): number {
  let strong = 0;
  for (const base of bases) if (isStrong(base)) strong += 1;
  return bases.length === 0 ? 0 : strong / bases.length;
}

export function gcPercent(bases: string): number {
  return 100 * gcFraction(bases);
}

/** How many of the last `count` bases are G or C. */
export function gcAtEnd(bases: string, count: number): number {
  return [...bases.slice(-count)].filter(isStrong).length;
}

/** Length of the longest run of one base. */
export function longestRun(bases: string): number {
  let longest = 0;
  for (let index = 0, run = 0; index < bases.length; index += 1) {
    run = index > 0 && bases[index] === bases[index - 1] ? run + 1 : 1;
    longest = Math.max(longest, run);
  }
  return longest;
}

/** Most often that two different bases follow each other in turn, in whole repeats: `ATATAT` is 3. */
export function longestDinucleotideRepeat(bases: string): number {
  let longest = bases.length >= 2 ? 1 : 0;
  for (let start = 0; start + 3 < bases.length; start += 1) {
    if (bases[start] === bases[start + 1]) continue;
    let length = 2;
    while (start + length < bases.length && bases[start + length] === bases[start + length - 2]) length += 1;
    longest = Math.max(longest, Math.floor(length / 2));
  }
  return longest;
}
