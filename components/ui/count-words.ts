/** `1 copy`, `3 copies`, `0 copies`. */
export const counted = (count: number, one: string, many = `${one}s`): string =>
  `${count} ${count === 1 ? one : many}`;

/** The same, where nothing is said in words: `no copies`. */
export const countWords = (count: number, one: string, many = `${one}s`): string =>
  count === 0 ? `no ${many}` : counted(count, one, many);
