// npm test: every check there is, from formatting to browsers. Ends with the line "N passed, N failed".
//   node scripts/test.mjs                  all steps, in order, going on after a failed one
//   node scripts/test.mjs unit api         these only
//   node scripts/test.mjs faults --full    at full size instead of the small one
import { mkdirSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import { removeLeftOver, startDatabase } from './lib/database.mjs';
import { Advice, ensureChromium, ensureDatabasePrograms } from './lib/debian.mjs';
import { installPackages } from './lib/dependencies.mjs';
import { testDir } from './lib/places.mjs';
import { onEndSignal } from './lib/processes.mjs';
import { steps } from './lib/test-steps.mjs';

// npm runs scripts through a shell that does not hand signals on.
if (process.env.npm_lifecycle_event) await import('./lib/end-with-parent.mjs');

const names = process.argv.slice(2).filter((word) => !word.startsWith('--'));
const size = process.argv.includes('--full') ? 'full' : 'small';
const unknown = names.filter((name) => !steps.some((step) => step.name === name));
const databases = [];
const total = { passed: 0, failed: 0 };
onEndSignal(stopDatabases);

try {
  if (unknown.length > 0) {
    throw new Advice(
      `No step is called ${unknown.join(', ')}. Steps: ${steps.map(({ name }) => name).join(', ')}.`,
    );
  }
  await runSteps(steps.filter(({ name }) => names.length === 0 || names.includes(name)));
} catch (error) {
  console.error(error instanceof Advice ? `\n${error.message}\n` : error);
  total.failed += 1;
} finally {
  await stopDatabases();
}
process.exitCode = total.failed === 0 ? 0 : 1;
console.log(`${total.passed} passed, ${total.failed} failed`);
process.exit();

async function runSteps(chosen) {
  await installPackages();
  const needed = new Set(chosen.flatMap(({ needs = [] }) => needs));
  if (needed.has('database')) await ensureDatabasePrograms();
  const chromium = needed.has('chromium') ? await ensureChromium() : '';
  const summary = [];
  for (const step of chosen) {
    console.log(`\n== ${step.name}`);
    const began = Date.now();
    const result = await runStep(step, chromium);
    total.passed += result.passed;
    total.failed += result.failed;
    const seconds = ((Date.now() - began) / 1000).toFixed(1);
    summary.push(`${step.name.padEnd(8)} ${result.passed} passed, ${result.failed} failed, ${seconds} s`);
  }
  console.log(`\n${summary.join('\n')}\n`);
}

async function runStep(step, chromium) {
  try {
    const needs = step.needs ?? [];
    if (needs.includes('client') && !names.includes('build') && names.length > 0) {
      const { buildClientIfChanged } = await import('./build-client.mjs');
      await buildClientIfChanged();
    }
    const env = { ...process.env, TEST_SIZE: size, NODE_ENV: 'test', CHROMIUM_PATH: chromium };
    if (needs.includes('database')) env.TEST_DATABASE_URL = await testDatabase(step.durable === true);
    return await step.run(env);
  } catch (error) {
    console.error(error instanceof Advice ? error.message : error);
    return { passed: 0, failed: 1 };
  }
}

/** The address of this run's own server, started when first asked for. */
async function testDatabase(durable) {
  const known = databases.find((database) => database.durable === durable);
  if (known) return known.url;
  mkdirSync(testDir, { recursive: true, mode: 0o700 });
  for (const name of readdirSync(testDir)) {
    if (name.startsWith('run-')) await removeLeftOver(path.join(testDir, name));
  }
  const dir = mkdtempSync(path.join(testDir, 'run-'));
  const database = await startDatabase({ dir, durable, allRights: true });
  databases.push({ ...database, durable, dir });
  return database.url;
}

async function stopDatabases() {
  for (const { stop, dir } of databases.splice(0)) {
    await stop();
    rmSync(dir, { recursive: true, force: true });
  }
}
