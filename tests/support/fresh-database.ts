// An empty database of a test file's own, on the run's server.
import { randomBytes } from 'node:crypto';
import mysql from 'mysql2/promise';

export interface FreshDatabase {
  readonly url: string;
  drop(): Promise<void>;
}

/** Makes an empty utf8mb4 database; `drop` removes it. The server comes from the Jest project's global setup. */
export async function createFreshDatabase(): Promise<FreshDatabase> {
  const server = process.env.TEST_DATABASE_URL;
  if (server === undefined)
    throw new Error('TEST_DATABASE_URL is not set: run this through Jest (project api).');
  const name = `locant_test_${process.pid}_${randomBytes(6).toString('hex')}`;
  await runStatement(server, `CREATE DATABASE \`${name}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
  const url = new URL(server);
  url.pathname = `/${name}`;
  return {
    url: url.toString(),
    drop: () => runStatement(server, `DROP DATABASE IF EXISTS \`${name}\``),
  };
}

async function runStatement(server: string, sql: string): Promise<void> {
  const connection = await mysql.createConnection({ uri: server });
  try {
    await connection.query(sql);
  } finally {
    await connection.end();
  }
}
