/**
 * The numbers over the columns of an alignment as one line of text: each tenth column, counted from 1, has its number
 * end above it. Set in the face of the rows it stands in step with them.
 */
export function rulerText(columnCount: number): string {
  const step = 10;
  let text = '';
  for (let column = step; column <= columnCount; column += step) text += String(column).padStart(step);
  return text.padEnd(columnCount);
}
