/** A label taken apart: `-4` is −4 and no suffix, `52A` is 52 and `A`. */
export interface LabelParts {
  number: number;
  suffix: string;
}

/** Largest number a label may carry; author numbers have at most seven digits in any format read. */
export const MAX_LABEL_NUMBER = 9_999_999;

/** Takes a label apart, or null when it is none. Minus variants (U+2212, U+2010–2013) count as hyphens. */
export function readLabel(text: string): LabelParts | null {
  const match = /^([-+\u2212\u2010-\u2013]?)(\d{1,7})([A-Za-z]{0,4})$/.exec(text.trim());
  if (match === null) return null;
  const digits = Number(match[2]);
  const negative = match[1] !== '' && match[1] !== '+' && digits !== 0;
  return { number: negative ? -digits : digits, suffix: match[3] ?? '' };
}

export function writeLabel({ number, suffix }: LabelParts): string {
  return `${number}${suffix}`;
}
