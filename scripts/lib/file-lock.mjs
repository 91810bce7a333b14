// A lock between processes: a file that names its holder, so that a lock left by a dead process can be taken over.
import { linkSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { isAlive, pause } from './processes.mjs';

/** Runs `work` while holding the lock file. Waits for another holder; takes over from a dead one. */
export async function withFileLock(file, work, timeoutMs = 60_000) {
  const end = Date.now() + timeoutMs;
  while (!tryLock(file)) {
    const holder = readHolder(file);
    if (holder !== null && !isAlive(holder)) {
      rmSync(file, { force: true });
      continue;
    }
    if (Date.now() > end) throw new Error(`Process ${holder} holds ${file} for too long.`);
    await pause(50);
  }
  try {
    return await work();
  } finally {
    rmSync(file, { force: true });
  }
}

// Written aside and linked, so that the lock never exists without its holder's number in it.
function tryLock(file) {
  const own = `${file}.${process.pid}`;
  writeFileSync(own, String(process.pid), { mode: 0o600 });
  try {
    linkSync(own, file);
    return true;
  } catch (error) {
    if (error.code === 'EEXIST') return false;
    throw error;
  } finally {
    rmSync(own, { force: true });
  }
}

function readHolder(file) {
  try {
    return Number(readFileSync(file, 'utf8')) || null;
  } catch {
    return null;
  }
}
