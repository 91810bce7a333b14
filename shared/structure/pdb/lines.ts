import type { LineSpan } from './columns';

const LF = 10;
const CR = 13;

/**
 * Calls `visit` for each line, which may end in LF, CRLF or CR; stops when it returns false. The same span object is
 * passed each time. A byte-order mark before the first line is left out.
 */
export function eachLine(bytes: Uint8Array, visit: (line: LineSpan) => boolean): void {
  const line: LineSpan = { start: hasByteOrderMark(bytes) ? 3 : 0, end: 0, number: 0 };
  // Looking for one byte is done by the engine at memory speed; only files with CR need the slower search.
  const endOfLine = bytes.includes(CR) ? endAtEither : endAtLineFeed;
  while (line.start < bytes.length) {
    line.end = endOfLine(bytes, line.start);
    line.number++;
    if (!visit(line)) return;
    const crlf = bytes[line.end] === CR && bytes[line.end + 1] === LF;
    line.start = line.end + (crlf ? 2 : 1);
  }
}

function hasByteOrderMark(bytes: Uint8Array): boolean {
  return bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf;
}

function endAtLineFeed(bytes: Uint8Array, from: number): number {
  const at = bytes.indexOf(LF, from);
  return at < 0 ? bytes.length : at;
}

function endAtEither(bytes: Uint8Array, from: number): number {
  let at = from;
  while (at < bytes.length && bytes[at] !== LF && bytes[at] !== CR) at++;
  return at;
}
