import { networkInterfaces } from 'node:os';
import { demoNote, loadDemoOnce } from './commands/demo';
import { createContainer } from './container';
import { migrate } from './db';
import { readEnv } from './env';
import { createLog, type Logger } from './lib/log';
import { endOnSignals } from './lib/shutdown';
import type { FileStore } from './storage';

async function main(): Promise<void> {
  const env = readEnv(process.env);
  const log = createLog(process.env.LOG_LEVEL ?? 'warn');
  const container = await createContainer(env, log);
  await migrate(container.source);
  await sweepRegularly(container.files, log);
  container.jobs.start();
  if (env.DEMO === '1') await loadDemoOnce(container, env);
  await new Promise<void>((done) => container.http.listen(env.PORT, env.HOST, done));
  endOnSignals(container.http, () => container.close());
  console.log(`\nLocant is at ${addresses(env.HOST, env.PORT).join(' and ')}`);
  if (env.DEMO === '1') console.log(demoNote(env));
}

const sweepEveryMilliseconds = 60 * 60_000;

/** What a killed process left half received goes at the next start, and once an hour. */
async function sweepRegularly(files: FileStore, log: Logger): Promise<void> {
  const sweep = () =>
    files.sweep().then(
      (count) => count > 0 && log.info({ count }, 'temporary files of a killed process removed'),
      (error: unknown) => log.warn({ err: error }, 'temporary files cannot be removed'),
    );
  await sweep();
  setInterval(() => void sweep(), sweepEveryMilliseconds).unref();
}

function addresses(host: string, port: number): string[] {
  if (host !== '0.0.0.0' && host !== '::')
    return [`http://${host === '127.0.0.1' ? 'localhost' : host}:${port}`];
  const outside = Object.values(networkInterfaces())
    .flatMap((list) => list ?? [])
    .filter((net) => net.family === 'IPv4' && !net.internal)
    .map((net) => `http://${net.address}:${port}`);
  return [`http://localhost:${port}`, ...outside];
}

main().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
  // A database that cannot be reached leaves timers behind.
  process.exit();
});
