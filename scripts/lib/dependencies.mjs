// Installs npm packages when what is installed differs from the lock file.
import { readFileSync } from 'node:fs';
import { fromRoot } from './places.mjs';
import { findProgram, run } from './processes.mjs';

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
  return true;
}

/** True when each package of the lock is there in its version (those of other systems may be absent). */
export function isInstalled(wanted, present) {
  return Object.entries(wanted).every(
    ([place, { version, optional, link }]) =>
      place === '' ||
      link ||
      present[place]?.version === version ||
      (optional && present[place] === undefined),
  );
}

// npm writes its own list of what it installed as the last step, so a broken-off install is seen too.
function isLockInstalled() {
  try {
    return isInstalled(
      readPackages(fromRoot('package-lock.json')),
      readPackages(fromRoot('node_modules', '.package-lock.json')),
    );
  } catch {
    return false;
  }
}

const readPackages = (file) => JSON.parse(readFileSync(file, 'utf8')).packages;
