/** Repeatable random draws: the same seed gives the same draws on every machine (integer arithmetic only). */
export interface Random {
  /** From 0 up to, not including, 1. */
  fraction(): number;
  /** One of the items, each equally likely. `items` must not be empty. */
  pick<T>(items: ArrayLike<T>): T;
}

/** Generator with 32 bits of state (mulberry32, public domain, T. Ettinger 2017, from memory). */
export function makeRandom(seed: number): Random {
  let state = seed >>> 0;
  const fraction = (): number => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
  const pick = <T>(items: ArrayLike<T>): T => items[Math.floor(fraction() * items.length)] as T;
  return { fraction, pick };
}
