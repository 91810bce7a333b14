import { createReadStream } from 'node:fs';

export interface Excerpt {
  /** Number of the first line shown, from 1. */
  firstLine: number;
  /** Number of the first character shown of each line, from 1. */
  firstColumn: number;
  lines: string[];
}

const lineFeed = 0x0a;
const carriageReturn = 0x0d;

/** Text that is safe to show: what cannot be seen is a dot, what is too long is cut. */
function shown(bytes: number[], maxCharacters: number): string {
  const text = new TextDecoder('utf-8')
    .decode(Uint8Array.from(bytes))
    .replace(/[\p{Cc}\p{Cf}\u2028\u2029]/gu, '·');
  const characters = [...text];
  return characters.length > maxCharacters ? `${characters.slice(0, maxCharacters).join('')}…` : text;
}

/** Bytes that continue a character of UTF-8 are no character of their own. */
const beginsCharacter = (byte: number): boolean => (byte & 0xc0) !== 0x80;

/**
 * The lines around `line` (from 1) of a file of any size and kind, read as a stream up to where they end. A line ends
 * with LF, CR LF or CR, as the readers count them. A `column` (from 1) that would be cut off stands in the middle.
 */
export async function readExcerpt(
  file: string,
  line: number,
  { around = 3, maxCharacters = 200, column = 1 } = {},
): Promise<Excerpt> {
  const firstLine = Math.max(1, line - around);
  const lastLine = line + around;
  // Four bytes are the longest character.
  const mostBytes = maxCharacters * 4 + 4;
  const firstColumn = column < maxCharacters ? 1 : column - Math.floor(maxCharacters / 2);
  const lines: string[] = [];
  let number = 1;
  let characters = 0;
  let kept: number[] = [];
  let empty = true;
  let afterReturn = false;
  const end = () => {
    if (number >= firstLine) lines.push(shown(kept, maxCharacters));
    number += 1;
    kept = [];
    characters = 0;
    empty = true;
  };
  for await (const chunk of createReadStream(file) as AsyncIterable<Buffer>) {
    for (const byte of chunk) {
      const pair = byte === lineFeed && afterReturn;
      afterReturn = byte === carriageReturn;
      if (pair) continue;
      if (byte === lineFeed || byte === carriageReturn) end();
      else {
        empty = false;
        if (beginsCharacter(byte)) characters += 1;
        const isShown = characters >= firstColumn && kept.length < mostBytes;
        if (number >= firstLine && isShown) kept.push(byte);
      }
      if (number > lastLine) return { firstLine, firstColumn, lines };
    }
  }
  if (!empty) end();
  return { firstLine, firstColumn, lines };
}
