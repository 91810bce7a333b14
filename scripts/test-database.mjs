// Keeps one database server for API tests running (in .data/test), or stops it, and prints how to use it.
//   node scripts/test-database.mjs         starts or finds it
//   node scripts/test-database.mjs stop    stops it
import path from 'node:path';
import { runningDatabase, startDatabase } from './lib/database.mjs';
import { testDir } from './lib/places.mjs';
import { endProcess } from './lib/processes.mjs';

const dir = path.join(testDir, 'shared');

if (process.argv[2] === 'stop') {
  const running = await runningDatabase(dir);
  if (running !== null) await endProcess(running.pid);
} else {
  const database = await startDatabase({ dir, durable: false, allRights: true });
  console.log(`TEST_DATABASE_URL=${database.url}`);
}
