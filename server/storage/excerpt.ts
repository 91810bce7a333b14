import { createReadStream } from 'node:fs';

export interface Excerpt {
  /** Number of the first line shown, from 1. */
  firstLine: number;
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

/**
 * The lines around `line` (from 1) of a file of any size and kind, read as a stream up to where they end. A line ends
 * with LF, CR LF or CR, as the readers count them.
 */
export async function readExcerpt(
  file: string,
  line: number,
  { around = 3, maxCharacters = 200 } = {},
): Promise<Excerpt> {
  const firstLine = Math.max(1, line - around);
  const lastLine = line + around;
  const lines: string[] = [];
  let number = 1;
  let kept: number[] = [];
  let empty = true;
  let afterReturn = false;
  const end = () => {
    if (number >= firstLine) lines.push(shown(kept, maxCharacters));
    number += 1;
    kept = [];
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
        // Four bytes are the longest character.
        if (number >= firstLine && kept.length < maxCharacters * 4 + 4) kept.push(byte);
      }
      if (number > lastLine) return { firstLine, lines };
    }
  }
  if (!empty) end();
  return { firstLine, lines };
}
