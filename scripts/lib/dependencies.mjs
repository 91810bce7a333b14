// Installs npm packages when what is installed differs from the lock file.
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { fromRoot } from './places.mjs';
import { findProgram, run } from './processes.mjs';
import { hashFiles } from './source-hash.mjs';

/** Runs `npm ci` when node_modules is missing, half-made or of another lock. Gives true when it ran. */
export async function installPackages() {
  if (isLockInstalled()) return false;
  console.log('Installing npm packages (a minute or two) …');
  const args = ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
  const npm = process.env.npm_execpath;
  const options = { cwd: fromRoot() };
  const code = npm?.endsWith('.js')
    ? await run(process.execPath, [npm, ...args], options)
    : await run(findProgram('npm') ?? 'npm', args, options);
  if (code !== 0) throw new Error(`npm ci ended with ${code}; what it says stands above.`);
  writeFileSync(stamp, lockHash());
  return true;
}

/** True when each package of the lock is there in its version (those of other systems may be absent). */
export function isInstalled(wanted, present) {
  return Object.entries(wanted).every(
    ([place, { version, optional, link, extraneous }]) =>
      place === '' ||
      link ||
      extraneous ||
      present[place]?.version === version ||
      (optional && present[place] === undefined),
  );
}

// Either this script installed this very lock (its hash is left in node_modules, which `npm ci` empties first), or
// somebody ran npm by hand: npm's own list, written as its last step, then has every version of the lock.
function isLockInstalled() {
  try {
    if (existsSync(stamp) && readFileSync(stamp, 'utf8') === lockHash()) return true;
    return isInstalled(
      readPackages(fromRoot('package-lock.json')),
      readPackages(fromRoot('node_modules', '.package-lock.json')),
    );
  } catch {
    return false;
  }
}

const stamp = fromRoot('node_modules', '.lock-hash');
const lockHash = () => hashFiles([fromRoot('package-lock.json')]);
const readPackages = (file) => JSON.parse(readFileSync(file, 'utf8')).packages;
