/** Letters in one row of the grid. */
export const rowLength = 10;

/** Where a key leads in a field of `count` letters; undefined for keys that are none of the field's. */
export function gridStep(key: string, from: number, count: number): number | undefined {
  const rowStart = from - (from % rowLength);
  const targets: Record<string, number> = {
    ArrowLeft: from - 1,
    ArrowRight: from + 1,
    ArrowUp: from - rowLength,
    ArrowDown: from + rowLength,
    Home: rowStart,
    End: Math.min(rowStart + rowLength, count) - 1,
  };
  const to = targets[key];
  if (to === undefined) return undefined;
  return to < 0 || to >= count ? from : to;
}
