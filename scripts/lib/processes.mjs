// What is done with other processes: find a program, run one, wait for one to go.
import { spawn, spawnSync } from 'node:child_process';
import { accessSync, constants, readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';

export const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

/** The full path of a program, or null. Servers often lie in folders that are not in a person's PATH. */
export function findProgram(...names) {
  const folders = [...(process.env.PATH ?? '').split(path.delimiter), '/usr/sbin', '/usr/local/sbin'];
  for (const name of names) {
    for (const folder of folders.filter(Boolean)) {
      const file = path.join(folder, name);
      try {
        accessSync(file, constants.X_OK);
        return file;
      } catch {
        // not here, look on
      }
    }
  }
  return null;
}

export function isAlive(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error.code === 'EPERM';
  }
}

/** Waits until the process is gone; false when it is still there after the time. */
export async function waitUntilGone(pid, timeoutMs) {
  const end = Date.now() + timeoutMs;
  while (isAlive(pid) && !isZombie(pid)) {
    if (Date.now() > end) return false;
    await pause(30);
  }
  return true;
}

function isZombie(pid) {
  try {
    return / Z /.test(readFileSync(`/proc/${pid}/stat`, 'utf8').replace(/^.*\)/s, ''));
  } catch {
    return false;
  }
}

/** Ends one process: asks first, then insists. */
export async function endProcess(pid, patienceMs = 15_000) {
  for (const [signal, waitMs] of [
    ['SIGTERM', patienceMs],
    ['SIGKILL', 5_000],
  ]) {
    try {
      process.kill(pid, signal);
    } catch {
      return;
    }
    if (await waitUntilGone(pid, waitMs)) return;
  }
}

/** Every process as { pid, args }, from /proc where there is one, else from ps. */
export function listProcesses() {
  try {
    return readdirSync('/proc')
      .filter((name) => /^\d+$/.test(name))
      .flatMap((name) => {
        try {
          return [{ pid: Number(name), args: readFileSync(`/proc/${name}/cmdline`, 'utf8').split('\0') }];
        } catch {
          return [];
        }
      });
  } catch {
    const { stdout } = spawnSync('ps', ['-axo', 'pid=,args='], { encoding: 'utf8' });
    return (stdout ?? '')
      .split('\n')
      .map((line) => /^\s*(\d+)\s+(.*)$/.exec(line))
      .filter(Boolean)
      .map(([, pid, args]) => ({ pid: Number(pid), args: args.split(' ') }));
  }
}

const running = new Set();

/**
 * Runs a program with its output shown, and gives its exit code. It has a process group of its own, which ends
 * with it: whatever it has started and left behind goes too.
 */
export function run(command, args, options = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { stdio: 'inherit', detached: true, ...options });
    running.add(child);
    child.once('error', reject);
    child.once('exit', (code) => {
      running.delete(child);
      signalGroup(child, 'SIGKILL');
      resolve(code ?? 1);
    });
  });
}

function signalGroup(child, signal) {
  try {
    process.kill(-child.pid, signal);
  } catch {
    // nobody is left in it
  }
}

export const endSignals = ['SIGINT', 'SIGTERM', 'SIGHUP'];

/** On the first signal to end: ends what `run` runs now, does `cleanUp`, and exits. Gives a way to take it back. */
export function onEndSignal(cleanUp) {
  const end = async () => {
    takeBack();
    running.forEach((child) => signalGroup(child, 'SIGTERM'));
    await cleanUp();
    process.exit(130);
  };
  const takeBack = () => endSignals.forEach((name) => process.off(name, end));
  endSignals.forEach((name) => process.on(name, end));
  return takeBack;
}
