// Builds the web client into dist/: node scripts/build-client.mjs
import {
  copyFileSync,
  existsSync,
  mkdirSync,
  readFileSync,
  renameSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { withFileLock } from './lib/file-lock.mjs';
import { firstLoadScripts, inlineStyleHashes, packFiles, packedSize } from './lib/packing.mjs';
import { distDir, fromRoot } from './lib/places.mjs';
import { run } from './lib/processes.mjs';
import { clientSourceHash, listFiles } from './lib/source-hash.mjs';

const firstLoadLimitKilobytes = 420;
const threeMarks = ['WebGLRenderer', 'THREE.'];
const fonts = {
  'atkinson-hyperlegible-next': [
    'atkinson-hyperlegible-next-latin-400-normal',
    'atkinson-hyperlegible-next-latin-400-italic',
    'atkinson-hyperlegible-next-latin-600-normal',
    'atkinson-hyperlegible-next-latin-700-normal',
  ],
  'atkinson-hyperlegible-mono': [
    'atkinson-hyperlegible-mono-latin-400-normal',
    'atkinson-hyperlegible-mono-latin-600-normal',
    'atkinson-hyperlegible-mono-latin-700-normal',
  ],
  'noto-sans': ['noto-sans-greek-400-normal', 'noto-sans-greek-700-normal', 'noto-sans-latin-400-normal'],
  'noto-sans-mono': ['noto-sans-mono-greek-400-normal', 'noto-sans-mono-greek-700-normal'],
};

const hashFile = path.join(distDir, '.source-hash');

/** Builds the client when there is no build, or its sources have changed since. Gives true when it built. */
export async function buildClientIfChanged() {
  mkdirSync(fromRoot('.data'), { recursive: true, mode: 0o700 });
  return withFileLock(fromRoot('.data', 'build.lock'), buildIfChanged, 600_000);
}

async function buildIfChanged() {
  const hash = clientSourceHash();
  if (existsSync(hashFile) && readFileSync(hashFile, 'utf8') === hash) return false;
  console.log('Building the web client (about a minute) …');
  await buildClient(hash);
  return true;
}

async function buildClient(hash) {
  copyFonts();
  // Built aside, so that a build that fails leaves the last good one in place.
  const fresh = fromRoot('.data', 'build');
  rmSync(fresh, { recursive: true, force: true });
  await exportClient(fresh);
  const scripts = checkFirstLoad(fresh);
  writeFileSync(path.join(fresh, 'csp.json'), JSON.stringify({ styles: inlineStyleHashes(fresh) }, null, 2));
  await packFiles(fresh);
  writeFileSync(path.join(fresh, '.source-hash'), hash);
  rmSync(distDir, { recursive: true, force: true });
  renameSync(fresh, distDir);
  for (const { address, gzipBytes } of scripts)
    console.log(`  ${kilobytes(gzipBytes)} KB gzipped  ${address}`);
  const total = scripts.reduce((sum, { gzipBytes }) => sum + gzipBytes, 0);
  console.log(`First-load script: ${kilobytes(total)} KB gzipped (limit ${firstLoadLimitKilobytes}).`);
  console.log(`Loaded per screen: ${screenChunks(distDir).join(', ')}.`);
}

function copyFonts() {
  mkdirSync(fromRoot('public', 'fonts'), { recursive: true });
  for (const [family, names] of Object.entries(fonts)) {
    const folder = fromRoot('node_modules', '@fontsource', family);
    for (const name of names) {
      copyFileSync(path.join(folder, 'files', `${name}.woff2`), fromRoot('public', 'fonts', `${name}.woff2`));
    }
    copyFileSync(path.join(folder, 'LICENSE'), fromRoot('public', 'fonts', `${family}-LICENSE.txt`));
  }
}

async function exportClient(folder) {
  const expo = fromRoot('node_modules', 'expo', 'bin', 'cli');
  const args = [expo, 'export', '--platform', 'web', '--output-dir', folder];
  const env = { ...process.env, CI: '1', EXPO_OFFLINE: '1', EXPO_NO_TELEMETRY: '1', NODE_ENV: 'production' };
  const code = await run(process.execPath, args, { cwd: fromRoot(), env });
  if (code !== 0) throw new Error(`The web client did not build (expo export ended with ${code}).`);
}

function checkFirstLoad(folder) {
  const scripts = firstLoadScripts(folder);
  const withThree = scripts.filter(({ text }) => threeMarks.some((mark) => text.includes(mark)));
  if (withThree.length > 0) {
    throw new Error(`three.js is in the first load (${withThree.map(({ address }) => address).join(', ')}).`);
  }
  const total = scripts.reduce((sum, { gzipBytes }) => sum + gzipBytes, 0);
  if (total > firstLoadLimitKilobytes * 1000) {
    throw new Error(`The first load is ${kilobytes(total)} KB gzipped, over ${firstLoadLimitKilobytes} KB.`);
  }
  return scripts;
}

/** The chunks that index.html does not name, largest first: each screen and layout fetches its own. */
function screenChunks(folder) {
  const named = new Set(firstLoadScripts(folder).map(({ address }) => path.basename(address)));
  return listFiles(path.join(folder, '_expo'))
    .filter((file) => file.endsWith('.js') && !named.has(path.basename(file)))
    .map((file) => ({ name: path.basename(file).split('-')[0], bytes: packedSize(file) }))
    .sort((a, b) => b.bytes - a.bytes)
    .map(({ name, bytes }) => `${name} ${kilobytes(bytes)} KB`);
}

const kilobytes = (bytes) => (bytes / 1000).toFixed(1);

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  await buildClient(clientSourceHash());
}
