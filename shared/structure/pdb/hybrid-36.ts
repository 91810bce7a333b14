const UPPER_FIRST = 10;
const LOWER_FIRST = 36;

/**
 * Number in a hybrid-36 field: decimal as far as it fits, then `A000…` to `ZZZ…`, then `a000…` to `zzz…`.
 * Null when the text is neither. Source: the open description of hybrid-36 by R. W. Grosse-Kunstleve.
 */
export function decodeHybrid36(text: string, width: number): number | null {
  const field = text.trim();
  if (/^-?\d+$/.test(field)) return Number(field);
  if (field.length !== width) return null;
  const upper = /^[A-Z][0-9A-Z]*$/.test(field);
  if (!upper && !/^[a-z][0-9a-z]*$/.test(field)) return null;
  return parseInt(field, 36) + firstOf(width, upper ? UPPER_FIRST : LOWER_FIRST);
}

/** The number right-justified in a field of that width, or null when it does not fit even in hybrid-36. */
export function encodeHybrid36(value: number, width: number): string | null {
  const decimal = String(value);
  if (decimal.length <= width) return decimal.padStart(width);
  if (value < 0) return null;
  const asUpper = (value - firstOf(width, UPPER_FIRST)).toString(36);
  if (asUpper.length === width) return asUpper.toUpperCase();
  const asLower = (value - firstOf(width, LOWER_FIRST)).toString(36);
  return asLower.length === width ? asLower : null;
}

/** What to add to the base-36 reading of a field so that the letters go on where the numbers before them end. */
function firstOf(width: number, family: number): number {
  const step = 36 ** (width - 1);
  const decimals = 10 ** width;
  if (family === UPPER_FIRST) return decimals - UPPER_FIRST * step;
  return decimals + 26 * step - UPPER_FIRST * step;
}
