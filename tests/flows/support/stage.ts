// A served product and a browser in front of it, once for a file of flows.
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { chromium, type Browser } from 'playwright-core';
import { createFreshDatabase } from '@/tests/support/fresh-database';
import { startServerProcess, type ServerProcess } from '@/tests/support/server-process';

export interface FlowStage {
  browser: Browser;
  server: ServerProcess;
  close(): Promise<void>;
}

/** Starts the server on an empty database, with the demo when asked for, and Debian's Chromium. */
export async function openFlowStage({ demo = false } = {}): Promise<FlowStage> {
  const database = await createFreshDatabase();
  const dataDir = await mkdtemp(path.join(tmpdir(), 'locant-flow-'));
  const server = await startServerProcess({ databaseUrl: database.url, dataDir, demo });
  const browser = await chromium.launch({
    executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-background-networking',
      '--disable-component-update',
      '--no-first-run',
    ],
  });
  return {
    browser,
    server,
    async close() {
      await browser.close();
      await server.stop();
      await database.drop();
      await rm(dataDir, { recursive: true, force: true });
    },
  };
}
