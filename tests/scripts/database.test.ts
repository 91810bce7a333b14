// The private database as the start script uses it: real servers in folders of their own.
import { mkdtempSync, rmSync, statSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import mysql from 'mysql2/promise';
import { runningDatabase, startDatabase } from '../../scripts/lib/database.mjs';

jest.setTimeout(60_000);

let dir: string;
beforeEach(() => {
  dir = path.join(
    mkdtempSync(path.join(os.tmpdir(), 'database-')),
    'a folder whose name is long '.repeat(5).trim(),
  );
});
afterEach(async () => {
  const left = await runningDatabase(dir);
  if (left !== null) process.kill(left.pid, 'SIGKILL');
  rmSync(path.dirname(dir), { recursive: true, force: true });
});

async function ask(url: string, sql: string): Promise<Record<string, unknown>> {
  const connection = await mysql.createConnection(url);
  try {
    const [rows] = await connection.query(sql);
    return (Array.isArray(rows) ? rows[0] : {}) as Record<string, unknown>;
  } finally {
    await connection.end();
  }
}

test('it keeps its data, its password and its port over a restart, and flushes each commit', async () => {
  const first = await startDatabase({ dir });
  await ask(first.url, 'CREATE TABLE note (body VARCHAR(20))');
  await ask(first.url, "INSERT INTO note VALUES ('βE202')");
  await first.stop();
  await expect(ask(first.url, 'SELECT 1')).rejects.toThrow();

  const second = await startDatabase({ dir });
  expect(second.url).toBe(first.url);
  expect(await ask(second.url, 'SELECT body FROM note')).toEqual({ body: 'βE202' });
  expect(
    await ask(second.url, 'SELECT @@innodb_flush_log_at_trx_commit f, @@log_bin b, @@collation_database c'),
  ).toEqual({ f: 1, b: 0, c: 'utf8mb4_unicode_ci' });
  await second.stop();
});

test('it is adopted while it runs, and only who started it stops it', async () => {
  const first = await startDatabase({ dir });
  const second = await startDatabase({ dir });
  expect([second.pid, second.adopted]).toEqual([first.pid, true]);
  expect(await runningDatabase(dir)).toMatchObject({ pid: first.pid, url: first.url });
  await first.stop();
  expect(await runningDatabase(dir)).toBeNull();
});

test('one that no longer answers is replaced', async () => {
  const stale = await startDatabase({ dir });
  process.kill(stale.pid, 'SIGSTOP');
  const fresh = await startDatabase({ dir, patienceMs: 500 });
  expect(fresh.adopted).toBe(false);
  expect(fresh.pid).not.toBe(stale.pid);
  expect(await ask(fresh.url, 'SELECT 1 AS one')).toEqual({ one: 1 });
  await fresh.stop();
});

test('nobody gets in without the password, and only its owner reads it', async () => {
  const database = await startDatabase({ dir });
  for (const account of ['root', 'locant']) {
    const url = new URL(database.url);
    url.username = account;
    url.password = '';
    await expect(ask(url.toString(), 'SELECT 1')).rejects.toThrow(/Access denied/);
  }
  expect(statSync(dir).mode & 0o777).toBe(0o700);
  expect(statSync(path.join(dir, 'server.json')).mode & 0o777).toBe(0o600);
  await database.stop();
});

test('two starts at once share one server', async () => {
  const [one, other] = await Promise.all([startDatabase({ dir }), startDatabase({ dir })]);
  expect(one.pid).toBe(other.pid);
  await one.stop();
});
