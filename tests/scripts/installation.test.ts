// Secrets, locks and processes: the parts of the start script that must hold when things go wrong.
import { mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { spawn, spawnSync } from 'node:child_process';
import { withFileLock } from '../../scripts/lib/file-lock.mjs';
import { isInstalled } from '../../scripts/lib/dependencies.mjs';
import { isAlive, run, waitUntilGone } from '../../scripts/lib/processes.mjs';
import { nextFreePort, anyFreePort, isPortFree } from '../../scripts/lib/ports.mjs';
import { readOrMakeSecrets } from '../../scripts/lib/secrets.mjs';
import net from 'node:net';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(path.join(os.tmpdir(), 'installation-'));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

test('secrets are made once, at random, and only their owner reads them', () => {
  const first = readOrMakeSecrets(folder);
  expect(readOrMakeSecrets(folder)).toEqual(first);
  expect(statSync(path.join(folder, 'secrets.json')).mode & 0o777).toBe(0o600);
  expect(first.tokenSecret.length).toBeGreaterThanOrEqual(32);
  expect(first.demoPassword).toMatch(/^[a-z]{4}(-[a-z]{4}){3}$/);
  const other = readOrMakeSecrets(path.join(folder, 'other'));
  expect(other.tokenSecret).not.toBe(first.tokenSecret);
  expect(other.demoPassword).not.toBe(first.demoPassword);
});

test('a broken secrets file stops the start instead of signing everyone out', () => {
  writeFileSync(path.join(folder, 'secrets.json'), '{"tokenSecret": ');
  expect(() => readOrMakeSecrets(folder)).toThrow(/cannot be read/);
  expect(readFileSync(path.join(folder, 'secrets.json'), 'utf8')).toBe('{"tokenSecret": ');
});

test('a lock is held by one at a time and taken over from a dead process', async () => {
  const file = path.join(folder, 'lock');
  let inside = 0;
  let most = 0;
  const work = async () => {
    inside += 1;
    most = Math.max(most, inside);
    await new Promise((resolve) => setTimeout(resolve, 20));
    inside -= 1;
  };
  await Promise.all([1, 2, 3].map(() => withFileLock(file, work)));
  expect(most).toBe(1);

  const dead = spawnSync(process.execPath, ['-e', '']).pid;
  writeFileSync(file, String(dead));
  await expect(withFileLock(file, async () => 'mine')).resolves.toBe('mine');
});

test('an install counts as whole only when every package has the version of the lock', () => {
  const wanted = {
    '': { version: '1.0.0' },
    'node_modules/a': { version: '1.0.0' },
    'node_modules/left-over': { version: '1.0.0', extraneous: true },
    'node_modules/other-system': { version: '1.0.0', optional: true },
  };
  expect(isInstalled(wanted, { 'node_modules/a': { version: '1.0.0' } })).toBe(true);
  expect(isInstalled(wanted, { 'node_modules/a': { version: '1.0.1' } })).toBe(false);
  expect(isInstalled(wanted, {})).toBe(false);
});

test('a taken port is passed over', async () => {
  const port = await anyFreePort();
  const server = net.createServer().listen(port, '127.0.0.1');
  await new Promise((resolve) => server.once('listening', resolve));
  expect(await isPortFree(port)).toBe(false);
  expect(await nextFreePort(port, '127.0.0.1')).toBeGreaterThan(port);
  await new Promise((resolve) => server.close(resolve));
});

test('what a step leaves running ends with it', async () => {
  const note = path.join(folder, 'pid');
  const leaveBehind = `
    const child = require('child_process').spawn(process.execPath, ['-e', 'setInterval(() => {}, 1000)'], { stdio: 'ignore' });
    require('fs').writeFileSync(${JSON.stringify(note)}, String(child.pid));
    process.exit(3);`;
  expect(await run(process.execPath, ['-e', leaveBehind])).toBe(3);
  const left = Number(readFileSync(note, 'utf8'));
  expect(await waitUntilGone(left, 5_000)).toBe(true);
});

test('a server ends when the script that started it is killed outright', async () => {
  const guard = path.resolve(__dirname, '../../scripts/lib/end-with-parent.mjs');
  const server = `process.stdout.write(String(process.pid)); setInterval(() => {}, 1000)`;
  const script = `require('child_process').spawn(process.execPath, ['--import', ${JSON.stringify(guard)}, '-e', ${JSON.stringify(server)}], { detached: true, stdio: 'inherit' })`;
  const parent = spawn(process.execPath, ['-e', script], { stdio: ['ignore', 'pipe', 'inherit'] });
  const pid = Number(await new Promise((resolve) => parent.stdout.once('data', resolve)));
  expect(isAlive(pid)).toBe(true);
  parent.kill('SIGKILL');
  expect(await waitUntilGone(pid, 5_000)).toBe(true);
});
