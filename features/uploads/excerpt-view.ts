/** One line of a file as it is shown, its marked character set apart. */
export interface ExcerptLine {
  /** From 1. */
  number: number;
  isMarked: boolean;
  before: string;
  /** The character of the issue; empty on other lines, and where the line ends before it. */
  mark: string;
  after: string;
}

/** Lays the lines around an issue out; `line` and the columns count from 1, columns in characters. */
export function excerptView(
  excerpt: { firstLine: number; firstColumn: number; lines: readonly string[] },
  place: { line: number; column?: number },
): ExcerptLine[] {
  return excerpt.lines.map((text, at) => {
    const number = excerpt.firstLine + at;
    const isMarked = number === place.line;
    if (!isMarked || place.column === undefined)
      return { number, isMarked, before: text, mark: '', after: '' };
    const characters = [...text];
    const index = place.column - excerpt.firstColumn;
    return {
      number,
      isMarked,
      before: characters.slice(0, index).join(''),
      // Behind the last character there is something missing: a blank is marked.
      mark: characters[index] ?? '\u00a0',
      after: characters.slice(index + 1).join(''),
    };
  });
}
