// npm start: installs what is missing, starts the private database, builds the web client when it changed,
// and runs the server until it is told to end. Plain Node, so that it works before anything is installed.
import { spawn } from 'node:child_process';
import path from 'node:path';
import { startDatabase } from './lib/database.mjs';
import { Advice, ensureDatabasePrograms } from './lib/debian.mjs';
import { installPackages } from './lib/dependencies.mjs';
import { dataDir, distDir, fromRoot } from './lib/places.mjs';
import { isPortFree, nextFreePort } from './lib/ports.mjs';
import { endSignals, onEndSignal } from './lib/processes.mjs';
import { readOrMakeSecrets } from './lib/secrets.mjs';

const firstPort = 4810;
// npm runs scripts through a shell that does not hand signals on.
if (process.env.npm_lifecycle_event) await import('./lib/end-with-parent.mjs');

try {
  process.exitCode = await start();
} catch (error) {
  console.error(error instanceof Advice ? `\n${error.message}\n` : error);
  process.exitCode = 1;
}

async function start() {
  checkNode();
  await installPackages();
  const host = process.env.HOST || '127.0.0.1';
  const port = await choosePort(host);
  const secrets = readOrMakeSecrets(dataDir);
  const { buildClientIfChanged } = await import('./build-client.mjs');
  const ownDatabase = !process.env.DATABASE_URL;
  if (ownDatabase) await ensureDatabasePrograms();
  const database = ownDatabase ? await startDatabase({ dir: path.join(dataDir, 'database') }) : null;
  const takeBack = onEndSignal(async () => database?.stop());
  try {
    await buildClientIfChanged();
    takeBack();
    return await runServer({
      DATABASE_URL: database?.url ?? process.env.DATABASE_URL,
      HOST: host,
      PORT: String(port),
      DATA_DIR: dataDir,
      CLIENT_DIR: distDir,
      TOKEN_SECRET: process.env.TOKEN_SECRET || secrets.tokenSecret,
      // The demo loads into the private database only, unless asked for.
      DEMO: process.env.DEMO || (ownDatabase ? '1' : '0'),
      DEMO_PASSWORD: process.env.DEMO_PASSWORD || secrets.demoPassword,
      PRIVATE_DATABASE: ownDatabase ? '1' : '0',
    });
  } finally {
    await database?.stop();
  }
}

function checkNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major < 20 || (major === 20 && minor < 11)) {
    throw new Advice(`Locant needs Node 20.20 or newer; this is ${process.versions.node}.`);
  }
}

async function choosePort(host) {
  const wanted = Number(process.env.PORT || 0);
  if (wanted === 0) return nextFreePort(firstPort, host);
  if (!(await isPortFree(wanted, host))) {
    throw new Advice(`Port ${wanted} is taken on ${host}. Choose another: PORT=${wanted + 1} npm start`);
  }
  return wanted;
}

/** Runs the server, hands signals on to it, and gives its exit code when it has ended. */
function runServer(settings) {
  const preloads = ['tsx', './scripts/lib/end-with-parent.mjs'].flatMap((name) => ['--import', name]);
  const child = spawn(process.execPath, [...preloads, 'server/index.ts'], {
    cwd: fromRoot(),
    env: { NODE_ENV: 'production', ...process.env, ...settings },
    stdio: 'inherit',
    detached: true, // a group of its own: Ctrl-C reaches it once, through here
  });
  let askedAt = null;
  const passOn = (signal) => {
    // A terminal and npm both send Ctrl-C: that is one wish, not two.
    if (askedAt !== null && Date.now() - askedAt < 1_000) return;
    askedAt = Date.now();
    child.kill(signal);
  };
  endSignals.forEach((signal) => process.on(signal, passOn));
  return new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('exit', (code, signal) => {
      endSignals.forEach((name) => process.off(name, passOn));
      if (code === null && askedAt === null) console.error(`The server was ended by ${signal}.`);
      resolve(code ?? (askedAt === null ? 1 : 0));
    });
  });
}
