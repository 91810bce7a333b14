// One hash over a set of files, so that a build knows whether its sources have changed since.
import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';
import { fromRoot, root } from './places.mjs';

const clientSources = [
  'app',
  'features',
  'components',
  'client',
  'shared',
  'stand-ins',
  'public',
  'assets',
  'app.json',
  'metro.config.js',
  'metro.left-out.cjs',
  'babel.config.js',
  'package-lock.json',
  'tsconfig.json',
  'scripts/build-client.mjs',
];
// The fonts are copied in from their packages, which package-lock.json stands for.
const madeByBuild = [fromRoot('public', 'fonts')];

/** The hash of everything that goes into the web client. */
export const clientSourceHash = () => hashFiles(clientSources.map((name) => fromRoot(name)));

/** One hash over the files under these places: their names and contents. */
export function hashFiles(places) {
  const hash = createHash('sha256');
  for (const file of places.flatMap(listFiles)) {
    const content = createHash('sha256').update(readFileSync(file)).digest('hex');
    hash.update(`${path.relative(root, file)}\0${content}\n`);
  }
  return hash.digest('hex');
}

/** All files under a place in a fixed order; none when there is no such place. */
export function listFiles(place) {
  if (madeByBuild.includes(place)) return [];
  const found = statSync(place, { throwIfNoEntry: false });
  if (found === undefined) return [];
  if (found.isFile()) return [place];
  return readdirSync(place)
    .sort()
    .flatMap((name) => listFiles(path.join(place, name)));
}
