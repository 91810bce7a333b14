/** Character codes that the format gives a meaning. */
export const BLANK = 32;
const PLUS = 43;
const MINUS = 45;
const POINT = 46;

/** One line of the file: its text in `[start, end)` without the line end, and its number from 1. */
export interface LineSpan {
  start: number;
  end: number;
  number: number;
}

/** Reads fields of a file by their place. A class, so that calls from other modules cost nothing in the hot loop. */
export class Columns {
  constructor(readonly bytes: Uint8Array) {}

  /** The byte at an index; a blank outside the file, as a line that ends early is blank to its end. */
  byte(index: number): number {
    return this.bytes[index] ?? BLANK;
  }

  /**
   * Fixed decimal in `[from, to)`, blanks around it allowed. NaN when it is anything else; `whenBlank` for a field of
   * blanks. No string is made: this runs several times a line.
   */
  decimal(from: number, to: number, whenBlank: number): number {
    const { bytes } = this;
    let at = from;
    while (at < to && bytes[at] === BLANK) at++;
    if (at >= to) return whenBlank;
    let sign = 1;
    const first = bytes[at];
    if (first === MINUS || first === PLUS) {
      if (first === MINUS) sign = -1;
      at++;
    }
    let digits = 0;
    let mantissa = 0;
    let scale = 1;
    let afterPoint = false;
    for (; at < to; at++) {
      const byte = bytes[at] ?? BLANK;
      if (byte >= 48 && byte <= 57) {
        mantissa = mantissa * 10 + (byte - 48);
        if (afterPoint) scale *= 10;
        digits++;
      } else if (byte === POINT && !afterPoint) afterPoint = true;
      else break;
    }
    for (; at < to; at++) if (bytes[at] !== BLANK) return NaN;
    return digits === 0 ? NaN : (sign * mantissa) / scale;
  }

  /** Four bytes as one number: equal numbers, equal fields. */
  four(from: number): number {
    return (
      (this.byte(from) << 24) | (this.byte(from + 1) << 16) | (this.byte(from + 2) << 8) | this.byte(from + 3)
    );
  }

  /** Columns `first` to `last` (from 1, inclusive) of a line as Latin-1 text; shorter where the line ends. */
  text(line: LineSpan, first: number, last: number): string {
    const to = Math.min(line.start + last, line.end);
    let text = '';
    for (let at = line.start + first - 1; at < to; at++) text += String.fromCharCode(this.byte(at));
    return text;
  }
}

/** The number that `Columns.four` gives for this text of up to four characters. */
export function packedText(text: string): number {
  const padded = text.padEnd(4);
  return new Columns(Uint8Array.from(padded, (letter) => letter.charCodeAt(0))).four(0);
}
