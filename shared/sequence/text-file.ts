import { IssueList } from './issue-list';
import type { ParseResult } from './parse-result';

/** Largest text file read, unless asked otherwise. */
export const MAX_TEXT_BYTES = 64 * 1024 * 1024;

/** One line of a text, without its line end; `number` counts from 1 in the original file. */
export interface TextLine {
  number: number;
  text: string;
}

/** Line and column, from 1, of an offset in a text (or bytes) whose lines end with LF, CRLF or CR. */
function placeOf(codes: ArrayLike<number>, offset: number): { line: number; column: number } {
  let line = 1;
  let lineStart = 0;
  for (let index = 0; index < offset; index += 1) {
    const crlf = codes[index] === 13 && codes[index + 1] === 10;
    if ((codes[index] === 10 || codes[index] === 13) && !crlf) {
      line += 1;
      lineStart = index + 1;
    }
  }
  return { line, column: offset - lineStart + 1 };
}

function megabytes(bytes: number): string {
  return `${(bytes / 1024 / 1024).toFixed(bytes < 10 * 1024 * 1024 ? 1 : 0)} MB`;
}

/**
 * Text of an uploaded file: UTF-8, or Latin-1 with the warning `text-not-utf8`; a byte-order mark is dropped.
 * Errors: `file-empty`, `file-too-large`, `file-binary` (a NUL byte, with its place; UTF-16 says so).
 */
export function decodeText(bytes: Uint8Array, maxBytes = MAX_TEXT_BYTES): ParseResult<string> {
  const issues = new IssueList();
  if (bytes.length === 0)
    issues.error('file-empty', 'The file is empty. Choose the file again, or save it anew.');
  if (bytes.length > maxBytes)
    issues.error(
      'file-too-large',
      `The file has ${megabytes(bytes.length)}; up to ${megabytes(maxBytes)} are read. Cut it into parts.`,
    );
  if (issues.hasErrors) return issues.result('');
  const isUtf16 = (bytes[0] === 0xff && bytes[1] === 0xfe) || (bytes[0] === 0xfe && bytes[1] === 0xff);
  const nul = bytes.indexOf(0);
  if (isUtf16 || nul !== -1) {
    issues.error(
      'file-binary',
      isUtf16
        ? 'The file is text in UTF-16. Save it as UTF-8 (or plain text) and upload it again.'
        : 'The file is not plain text (it holds a NUL byte here). Export it as plain text and upload it again.',
      isUtf16 ? { line: 1, column: 1 } : placeOf(bytes, nul),
    );
    return issues.result('');
  }
  let text: string;
  try {
    text = new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    text = new TextDecoder('latin1').decode(bytes);
    issues.warning(
      'text-not-utf8',
      'The file is not UTF-8; it was read as Latin-1. Check names with accents.',
    );
  }
  const body = text.charCodeAt(0) === 0xfeff ? text.slice(1) : text;
  if (body.trim() === '')
    issues.error('file-empty', 'The file holds nothing but blanks. Choose the right file.');
  return issues.result(body);
}

/** Lines of a text, whatever their line ends (LF, CRLF, CR). */
export function* linesOf(text: string): Generator<TextLine> {
  let start = 0;
  let number = 1;
  const lineEnd = /\r\n|\r|\n/g;
  for (let match = lineEnd.exec(text); match !== null; match = lineEnd.exec(text)) {
    yield { number, text: text.slice(start, match.index) };
    start = match.index + match[0].length;
    number += 1;
  }
  if (start < text.length) yield { number, text: text.slice(start) };
}
