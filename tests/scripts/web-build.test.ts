// What the build says about itself: first-load size, packed twins, inline style hashes, and when it is stale.
import { createHash } from 'node:crypto';
import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { brotliDecompressSync, gunzipSync, gzipSync } from 'node:zlib';
import { firstLoadScripts, inlineStyleHashes, packFiles } from '../../scripts/lib/packing.mjs';
import { hashFiles } from '../../scripts/lib/source-hash.mjs';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(path.join(os.tmpdir(), 'web-build-'));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

const write = (name: string, text: string) => {
  mkdirSync(path.dirname(path.join(folder, name)), { recursive: true });
  writeFileSync(path.join(folder, name), text);
};

test('the first load is what index.html names, not what screens fetch later', () => {
  const code = 'const residue = "cE59";\n'.repeat(200);
  write('index.html', '<script src="/theme.js"></script><script src="/_expo/entry-1.js" defer></script>');
  write('theme.js', 'x');
  write('_expo/entry-1.js', code);
  write('_expo/screen-2.js', code.repeat(50));
  const scripts = firstLoadScripts(folder);
  expect(scripts.map(({ address }) => address)).toEqual(['/theme.js', '/_expo/entry-1.js']);
  expect(scripts[1]).toMatchObject({
    bytes: code.length,
    gzipBytes: gzipSync(Buffer.from(code), { level: 9 }).length,
  });
});

test('packed twins unpack to the same bytes; small files have none', async () => {
  const text = 'αβγ '.repeat(1000);
  write('theme.css', text);
  write('tiny.css', 'a{}');
  await packFiles(folder);
  expect(gunzipSync(readFileSync(path.join(folder, 'theme.css.gz'))).toString()).toBe(text);
  expect(brotliDecompressSync(readFileSync(path.join(folder, 'theme.css.br'))).toString()).toBe(text);
  expect(() => readFileSync(path.join(folder, 'tiny.css.gz'))).toThrow();
});

test('every inline style is hashed, and the empty style of the style engine', () => {
  write('index.html', '<style id="reset">body{margin:0}</style>');
  const hash = (text: string) => `sha256-${createHash('sha256').update(text).digest('base64')}`;
  expect(inlineStyleHashes(folder)).toEqual([hash('body{margin:0}'), hash('')]);
});

test('the source hash changes with content, name and number of files, and with nothing else', () => {
  const hash = () => hashFiles([path.join(folder, 'app'), path.join(folder, 'missing')]);
  write('app/index.tsx', 'one');
  write('app/about.tsx', 'two');
  const first = hash();
  expect(hash()).toBe(first);
  write('app/index.tsx', 'two');
  const second = hash();
  write('app/third.tsx', '');
  const third = hash();
  expect(new Set([first, second, third]).size).toBe(3);
  rmSync(path.join(folder, 'app/third.tsx'));
  write('app/index.tsx', 'one');
  expect(hash()).toBe(first);
});
