// What the web server needs beside the exported files: packed twins, and the hashes of inline styles.
import { createHash } from 'node:crypto';
import { readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { promisify } from 'node:util';
import zlib from 'node:zlib';
import { listFiles } from './source-hash.mjs';

const gzip = promisify(zlib.gzip);
const brotli = promisify(zlib.brotliCompress);
const packable = /\.(js|css|html|json|svg|txt|map)$/;

/** Writes file.gz and file.br beside every text file worth it. */
export async function packFiles(folder) {
  await Promise.all(
    listFiles(folder)
      .filter((file) => packable.test(file))
      .map(async (file) => {
        const bytes = readFileSync(file);
        if (bytes.length < 1024) return;
        const brotliOptions = { params: { [zlib.constants.BROTLI_PARAM_QUALITY]: 9 } };
        writeFileSync(`${file}.gz`, await gzip(bytes, { level: 9 }));
        writeFileSync(`${file}.br`, await brotli(bytes, brotliOptions));
      }),
  );
}

/** A file's size in bytes when gzipped. */
export const packedSize = (file) => zlib.gzipSync(readFileSync(file), { level: 9 }).length;

/** The scripts that index.html names, each with its plain and gzipped size in bytes. */
export function firstLoadScripts(folder) {
  const page = readFileSync(path.join(folder, 'index.html'), 'utf8');
  return [...page.matchAll(/<script[^>]*\ssrc="([^"]+)"/g)].map(([, address]) => {
    const file = path.join(folder, new URL(address, 'http://local').pathname);
    const bytes = readFileSync(file);
    return {
      address,
      bytes: bytes.length,
      gzipBytes: packedSize(file),
      text: bytes.toString(),
    };
  });
}

/** The style-src hashes that a strict policy needs: those of index.html's inline styles and of the empty style. */
export function inlineStyleHashes(folder) {
  const page = readFileSync(path.join(folder, 'index.html'), 'utf8');
  const styles = [...page.matchAll(/<style[^>]*>([\s\S]*?)<\/style>/g)].map(([, text]) => text);
  return [...new Set([...styles, ''])].map(
    (text) => `sha256-${createHash('sha256').update(text).digest('base64')}`,
  );
}
