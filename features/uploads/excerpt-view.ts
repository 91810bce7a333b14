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

export interface ExcerptView {
  lines: ExcerptLine[];
  /** The column lies beyond the part of the line that is shown. */
  isBeyond: boolean;
}

/** Lays the lines around an issue out; `line` and `column` count from 1, columns in characters. */
export function excerptView(
  excerpt: { firstLine: number; lines: readonly string[] },
  place: { line: number; column?: number },
): ExcerptView {
  let isBeyond = false;
  const lines = excerpt.lines.map((text, at): ExcerptLine => {
    const number = excerpt.firstLine + at;
    const isMarked = number === place.line;
    if (!isMarked || place.column === undefined)
      return { number, isMarked, before: text, mark: '', after: '' };
    const characters = [...text];
    const index = place.column - 1;
    // A cut line ends in an ellipsis, which is no character of the file.
    isBeyond = text.endsWith('…') && index >= characters.length - 1;
    if (isBeyond) return { number, isMarked, before: text, mark: '', after: '' };
    return {
      number,
      isMarked,
      before: characters.slice(0, index).join(''),
      // Behind the last character there is something missing: a blank is marked.
      mark: characters[index] ?? '\u00a0',
      after: characters.slice(index + 1).join(''),
    };
  });
  return { lines, isBeyond };
}
