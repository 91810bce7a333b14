// A whole server on a database of its own, asked over HTTP as a browser would.
import type { AddressInfo } from 'node:net';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { createContainer, type Container } from '@/server/container';
import { migrate } from '@/server/db';
import { readEnv } from '@/server/env';
import { createLog } from '@/server/lib/log';
import { createFreshDatabase } from './fresh-database';

export interface TestServer {
  container: Container;
  /** `http://127.0.0.1:port` */
  origin: string;
  databaseUrl: string;
  close(): Promise<void>;
}

export const testSecret = 'a secret for tests that is long enough, surely';

export async function startTestServer(settings: Record<string, string> = {}): Promise<TestServer> {
  const database = await createFreshDatabase();
  const dataFolder = await mkdtemp(path.join(tmpdir(), 'locant-test-'));
  const env = readEnv({
    DATABASE_URL: database.url,
    DATA_DIR: dataFolder,
    TOKEN_SECRET: testSecret,
    PORT: '0',
    SIGN_IN_ATTEMPTS: '10000',
    ...settings,
  });
  const container = await createContainer(env, createLog('silent'));
  await migrate(container.source);
  container.jobs.start();
  await new Promise<void>((done) => container.http.listen(0, '127.0.0.1', done));
  const { port } = container.http.address() as AddressInfo;
  return {
    container,
    origin: `http://127.0.0.1:${port}`,
    databaseUrl: database.url,
    async close() {
      await container.close();
      container.http.closeAllConnections();
      await database.drop();
      await rm(dataFolder, { recursive: true, force: true });
    },
  };
}
