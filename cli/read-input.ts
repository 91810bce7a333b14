import { readFile } from 'node:fs/promises';
import { promisify } from 'node:util';
import { gunzip } from 'node:zlib';
import type { ParseResult } from '@/shared/sequence/parse-result';

/** A compressed file may not unfold to more than this. */
export const MAX_INPUT_BYTES = 512 * 1024 * 1024;

const unzip = promisify(gunzip);

async function readStandardInput(maxBytes: number): Promise<Buffer | null> {
  const parts: Buffer[] = [];
  let total = 0;
  for await (const part of process.stdin) {
    const bytes = Buffer.from(part);
    total += bytes.length;
    if (total > maxBytes) return null;
    parts.push(bytes);
  }
  return Buffer.concat(parts);
}

function failed(code: string, message: string): ParseResult<Uint8Array> {
  return { value: null, issues: [{ code, severity: 'error', message }] };
}

function reasonOf(error: unknown): string {
  const code = error instanceof Error && 'code' in error ? String(error.code) : '';
  if (code === 'ENOENT') return 'there is no such file';
  if (code === 'EISDIR') return 'it is a folder';
  if (code === 'EACCES') return 'it may not be read';
  return code === '' ? 'it could not be read' : `it could not be read (${code})`;
}

/**
 * Bytes of a file; `-` is standard input. Gzip is recognised by its first two bytes and unfolded.
 * Issues: `file-unreadable`, `file-too-large`, `gzip-damaged`. Never throws.
 */
export async function readInput(path: string, maxBytes = MAX_INPUT_BYTES): Promise<ParseResult<Uint8Array>> {
  let bytes: Buffer | null;
  try {
    bytes = path === '-' ? await readStandardInput(maxBytes) : await readFile(path);
  } catch (error) {
    return failed('file-unreadable', `${path}: ${reasonOf(error)}.`);
  }
  if (bytes === null || bytes.length > maxBytes)
    return failed('file-too-large', `${path}: more than ${maxBytes} bytes; split the file or cut it down.`);
  if (bytes[0] !== 0x1f || bytes[1] !== 0x8b) return { value: bytes, issues: [] };
  try {
    return { value: await unzip(bytes, { maxOutputLength: maxBytes }), issues: [] };
  } catch (error) {
    const tooLarge = error instanceof Error && 'code' in error && error.code === 'ERR_BUFFER_TOO_LARGE';
    return tooLarge
      ? failed('file-too-large', `${path}: unfolds to more than ${maxBytes} bytes.`)
      : failed('gzip-damaged', `${path}: the gzip file is damaged or cut short; make it again.`);
  }
}
