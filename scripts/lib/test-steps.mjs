// The steps of `npm test`: each a program to run and a way to count what it says.
import { readFileSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { fromRoot } from './places.mjs';
import { run } from './processes.mjs';
import { listFiles } from './source-hash.mjs';

const bin = (...parts) => fromRoot('node_modules', ...parts);

/** In the order they run. `needs`: what must be there first. `durable`: on a database that flushes each commit. */
export const steps = [
  {
    name: 'format',
    run: tool(bin('prettier', 'bin', 'prettier.cjs'), '--check', '--log-level', 'warn', '.'),
  },
  { name: 'lint', run: tool(bin('eslint', 'bin', 'eslint.js'), '.', '--max-warnings', '0') },
  { name: 'types', run: tool(bin('typescript', 'bin', 'tsc'), '--noEmit', '-p', '.') },
  { name: 'knip', run: tool(bin('knip', 'bin', 'knip.js'), '--no-progress') },
  { name: 'unit', run: jest('unit'), needs: ['database'] },
  { name: 'api', run: jest('api'), needs: ['database'] },
  { name: 'build', run: build },
  { name: 'flows', run: jest('flows', '--runInBand'), needs: ['database', 'chromium', 'client'] },
  { name: 'faults', run: jest('faults', '--runInBand'), needs: ['database'], durable: true },
  { name: 'fuzz', run: jest('fuzz', '--runInBand'), needs: ['database'] },
];

function tool(program, ...args) {
  return async (env) => {
    const code = await run(process.execPath, [program, ...args], { cwd: fromRoot(), env });
    return code === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
  };
}

async function build() {
  const { buildClientIfChanged } = await import('../build-client.mjs');
  const built = await buildClientIfChanged();
  if (!built) console.log('The web client is up to date.');
  return { passed: 1, failed: 0 };
}

function jest(project, ...args) {
  return async (env) => {
    const folder = fromRoot('tests', project);
    const special = !['unit', 'api'].includes(project);
    if (special && !listFiles(folder).some((file) => /\.(test|flow)\.tsx?$/.test(file))) {
      console.log(`There are no ${project} tests yet.`);
      return { passed: 0, failed: 0 };
    }
    const report = path.join(os.tmpdir(), `report-${process.pid}-${project}.json`);
    const options = [
      '--selectProjects',
      project,
      '--json',
      '--outputFile',
      report,
      '--passWithNoTests',
      // A connection that is slow to close must not hold a run whose results are there.
      '--forceExit',
      ...args,
    ];
    const code = await run(process.execPath, [bin('jest', 'bin', 'jest.js'), ...options], {
      cwd: fromRoot(),
      env,
      // Jest tells people its results on the error output; the JSON goes to the file.
      stdio: ['ignore', 'ignore', 'inherit'],
    });
    return countReport(report, code);
  };
}

// A file that cannot even be loaded holds no tests, and counts as one failure.
function countReport(file, code) {
  try {
    const report = JSON.parse(readFileSync(file, 'utf8'));
    const failed = report.numFailedTests + report.numRuntimeErrorTestSuites;
    return { passed: report.numPassedTests, failed: failed === 0 && code !== 0 ? 1 : failed };
  } catch {
    return { passed: 0, failed: 1 };
  } finally {
    rmSync(file, { force: true });
  }
}
