import type { IssueList } from '../issue-list';
import { encodeHybrid36 } from './hybrid-36';

const WIDTH = 80;

/** Builds lines of 80 columns; what does not fit its field is told as an error, never cut in silence. */
export class FixedLines {
  private readonly lines: string[] = [];

  constructor(private readonly issues: IssueList) {}

  /** Fields by their first column, from 1, in order. */
  add(...fields: readonly (readonly [column: number, text: string])[]): void {
    let line = '';
    for (const [column, text] of fields) {
      line = line.padEnd(column - 1) + text;
    }
    this.lines.push(line.padEnd(WIDTH));
  }

  /** Text at the left of a field. */
  left(text: string, width: number, what: string): string {
    return this.fit(printable(text), width, what).padEnd(width);
  }

  /** Text at the right of a field. */
  right(text: string, width: number, what: string): string {
    return this.fit(printable(text), width, what).padStart(width);
  }

  /** A fixed decimal at the right of a field. */
  decimal(value: number, width: number, digits: number, what: string): string {
    // From 1e21 on, digits are written with an exponent.
    if (!(Math.abs(value) < 1e20))
      this.issues.error('not-a-number', `${what} ${value} cannot be written as a number.`);
    // A value that rounds to zero is written without a sign.
    const text = value.toFixed(digits).replace(/^-(0\.?0*)$/, '$1');
    return this.fit(text, width, what).padStart(width);
  }

  /** A number at the right of a field, in hybrid-36 where decimals do not fit. */
  number(value: number, width: number, what: string): string {
    const text = Number.isInteger(value) ? encodeHybrid36(value, width) : null;
    if (text === null) {
      this.issues.error('field-too-narrow', `${what} ${value} does not fit ${width} columns.`);
      return ' '.repeat(width);
    }
    return text;
  }

  toText(): string {
    return this.lines.map((line) => `${line}\n`).join('');
  }

  private fit(text: string, width: number, what: string): string {
    if (text.length <= width) return text;
    this.issues.error('field-too-narrow', `${what} "${text.slice(0, 40)}" does not fit ${width} columns.`);
    return text.slice(0, width);
  }
}

/** The format is ASCII: anything else becomes a question mark. */
export function printable(text: string): string {
  return text.replace(/[^ -~]/g, '?');
}

/** Splits text at blanks into pieces of at most `width` characters. */
export function wrapped(text: string, width: number): string[] {
  const pieces: string[] = [];
  for (const word of printable(text).split(/\s+/).filter(Boolean)) {
    const last = pieces[pieces.length - 1];
    if (last !== undefined && last.length + 1 + word.length <= width)
      pieces[pieces.length - 1] = `${last} ${word}`;
    else pieces.push(...(word.match(new RegExp(`.{1,${width}}`, 'g')) ?? []));
  }
  return pieces;
}
