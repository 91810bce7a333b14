// Gives a Jest run its database server: TEST_DATABASE_URL when set, else the shared one when it runs
// (node scripts/test-database.mjs), else one of its own that ends with the run.
import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import path from 'node:path';
import { runningDatabase, startDatabase } from '../../scripts/lib/database.mjs';
import { testDir } from '../../scripts/lib/places.mjs';

export default async function prepareDatabase() {
  if (process.env.TEST_DATABASE_URL) return undefined;
  const shared = await runningDatabase(path.join(testDir, 'shared'));
  if (shared !== null) {
    process.env.TEST_DATABASE_URL = shared.url;
    return undefined;
  }
  mkdirSync(testDir, { recursive: true, mode: 0o700 });
  const dir = mkdtempSync(path.join(testDir, 'run-'));
  const database = await startDatabase({ dir, durable: false, allRights: true });
  process.env.TEST_DATABASE_URL = database.url;
  globalThis.stopTestDatabase = async () => {
    await database.stop();
    rmSync(dir, { recursive: true, force: true });
  };
  return undefined;
}
