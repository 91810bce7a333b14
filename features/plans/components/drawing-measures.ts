/** Places of the primer drawing, in pixels from its top left corner. */
export const drawing = {
  /** Width of one base. */
  cell: 13.5,
  /** Room for 5′ and 3′ at each side. */
  margin: 30,
  height: 196,
  topStrand: 52,
  bottomStrand: 162,
  strandHeight: 26,
  /** Baselines of the primers; each lies beside the strand it pairs with. */
  againstTop: { bars: 81, letters: 108 },
  againstBottom: { letters: 140, bars: 149 },
  barHeight: 8,
} as const;

export const columnX = (column: number): number => drawing.margin + column * drawing.cell;
export const endX = (column: number, length: number): number => columnX(column + length);
export const drawingWidth = (columns: number): number => 2 * drawing.margin + columns * drawing.cell;
/** One place for each letter, so that a whole row is one text. */
export const letterPlaces = (columns: readonly number[]): string =>
  columns.map((column) => columnX(column) + drawing.cell / 2).join(' ');
