/** Character codes that the format gives a meaning. */
export const BLANK = 32;
const PLUS = 43;
const MINUS = 45;
const POINT = 46;

/** The byte at an index; a blank outside the file, as a line that ends early is blank to its end. */
export function byteAt(bytes: Uint8Array, index: number): number {
  return bytes[index] ?? BLANK;
}

/**
 * Fixed decimal in `[from, to)`, blanks around it allowed. NaN when it is anything else; `whenBlank` for a field of
 * blanks. No string is made: this runs several times a line.
 */
export function readDecimal(bytes: Uint8Array, from: number, to: number, whenBlank: number): number {
  let at = from;
  while (at < to && byteAt(bytes, at) === BLANK) at++;
  if (at === to) return whenBlank;
  let sign = 1;
  const first = byteAt(bytes, at);
  if (first === MINUS || first === PLUS) {
    if (first === MINUS) sign = -1;
    at++;
  }
  let digits = 0;
  let mantissa = 0;
  let scale = 1;
  let afterPoint = false;
  for (; at < to; at++) {
    const byte = byteAt(bytes, at);
    if (byte >= 48 && byte <= 57) {
      mantissa = mantissa * 10 + (byte - 48);
      if (afterPoint) scale *= 10;
      digits++;
    } else if (byte === POINT && !afterPoint) afterPoint = true;
    else break;
  }
  for (; at < to; at++) if (byteAt(bytes, at) !== BLANK) return NaN;
  return digits === 0 ? NaN : (sign * mantissa) / scale;
}

/** Text in `[from, to)` byte by byte (Latin-1), blanks kept. For short fields. */
export function readText(bytes: Uint8Array, from: number, to: number): string {
  let text = '';
  for (let at = from; at < to; at++) text += String.fromCharCode(byteAt(bytes, at));
  return text;
}

/** Four bytes as one number: equal numbers, equal fields. */
export function packFour(bytes: Uint8Array, from: number): number {
  return (
    (byteAt(bytes, from) << 24) |
    (byteAt(bytes, from + 1) << 16) |
    (byteAt(bytes, from + 2) << 8) |
    byteAt(bytes, from + 3)
  );
}

/** One line of the file: its text in `[start, end)` without the line end, and its number from 1. */
export interface LineSpan {
  start: number;
  end: number;
  number: number;
}

/** Text of columns `first` to `last` (from 1, inclusive) of a line; shorter where the line ends. */
export function columnsOf(bytes: Uint8Array, line: LineSpan, first: number, last: number): string {
  return readText(bytes, Math.min(line.start + first - 1, line.end), Math.min(line.start + last, line.end));
}
