/** Numbers from 0 to 1 that are the same for the same seed (mulberry32, public domain). */
export function seeded(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
}

/** A whole number from `least` up to and with `most`. */
export const between = (random: () => number, least: number, most: number): number =>
  least + Math.floor(random() * (most - least + 1));

export function pick<Value>(random: () => number, values: readonly Value[]): Value {
  const value = values[Math.floor(random() * values.length)];
  if (value === undefined) throw new Error('There is nothing to pick from.');
  return value;
}
