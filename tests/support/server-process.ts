// The whole server as a process of its own, as `npm start` runs it, so that it can be killed outright.
import { spawn, type ChildProcess } from 'node:child_process';
import path from 'node:path';
import { anyFreePort } from '../../scripts/lib/ports.mjs';

export interface ServerProcessOptions {
  databaseUrl: string;
  /** Where uploaded bytes are kept. */
  dataDir: string;
  /** Stays the same over restarts; a free one when left out. */
  port?: number;
  /** Loads the demo at the first start; its accounts have `demoPassword`. */
  demo?: boolean;
  /** The built web client; the repository's own build when left out. */
  clientDir?: string;
  /** Further environment variables of server/env.ts. */
  settings?: Record<string, string>;
}

export interface ServerProcess {
  readonly origin: string;
  readonly port: number;
  /** The process that runs now, or ran last. */
  readonly pid: number;
  /** Everything it has printed so far, over all restarts. */
  readonly output: string;
  /** Starts it (again) on the same port, without waiting. */
  launch(): void;
  /** Resolves when it answers; rejects when it ended instead. */
  ready(): Promise<void>;
  /** SIGKILL: nothing is finished, nothing said goodbye. Does nothing when it does not run. */
  kill(): Promise<void>;
  /** Starts again on the same port and resolves when it answers; one that runs is killed first. */
  restart(): Promise<void>;
  /** Asks it to end, then insists. */
  stop(): Promise<void>;
}

export const demoPassword = 'a demo password for tests';

const root = path.join(__dirname, '../..');
const readyWithinMilliseconds = 60_000;
const stopWithinMilliseconds = 10_000;
const pause = (milliseconds: number) => new Promise<void>((done) => setTimeout(done, milliseconds));

/** Starts the server and waits until it answers. */
export async function startServerProcess(options: ServerProcessOptions): Promise<ServerProcess> {
  const server = await launchServerProcess(options);
  await server.ready();
  return server;
}

/** Starts the server without waiting for it. */
export async function launchServerProcess(options: ServerProcessOptions): Promise<ServerProcess> {
  const process = new Process(options, options.port ?? (await anyFreePort()));
  process.launch();
  return process;
}

class Process implements ServerProcess {
  output = '';
  private child: ChildProcess | null = null;
  private gone: Promise<void> = Promise.resolve();

  constructor(
    private readonly options: ServerProcessOptions,
    readonly port: number,
  ) {}

  get origin(): string {
    return `http://127.0.0.1:${this.port}`;
  }

  get pid(): number {
    return this.child?.pid ?? 0;
  }

  launch(): void {
    // It ends when this process does: a test run that is killed leaves nothing on the port.
    const preloads = ['tsx', './scripts/lib/end-with-parent.mjs'].flatMap((name) => ['--import', name]);
    const child = spawn(process.execPath, [...preloads, 'server/index.ts'], {
      cwd: root,
      env: { ...inherited(), ...this.settings() },
      stdio: ['ignore', 'pipe', 'pipe'],
      detached: true,
    });
    this.child = child;
    const keep = (chunk: Buffer) => (this.output += chunk.toString());
    child.stdout.on('data', keep);
    child.stderr.on('data', keep);
    this.gone = new Promise((done) => {
      child.once('exit', () => done());
      child.once('error', () => done());
    });
  }

  async ready(): Promise<void> {
    const until = Date.now() + readyWithinMilliseconds;
    while (this.runs()) {
      const answer = await fetch(`${this.origin}/readyz`).catch(() => null);
      await answer?.text();
      if (answer?.ok) return;
      if (Date.now() > until) throw new Error(`The server does not answer. It printed:\n${this.output}`);
      await pause(30);
    }
    throw new Error(`The server ended instead of answering. It printed:\n${this.output}`);
  }

  async kill(): Promise<void> {
    if (this.runs()) this.child?.kill('SIGKILL');
    await this.gone;
  }

  async restart(): Promise<void> {
    await this.kill();
    this.launch();
    await this.ready();
  }

  async stop(): Promise<void> {
    if (this.runs()) this.child?.kill('SIGTERM');
    const insist = setTimeout(() => void this.kill(), stopWithinMilliseconds);
    await this.gone;
    clearTimeout(insist);
  }

  private runs(): boolean {
    return this.child !== null && this.child.exitCode === null && this.child.signalCode === null;
  }

  private settings(): Record<string, string> {
    const { databaseUrl, dataDir, demo = false, clientDir, settings } = this.options;
    return {
      NODE_ENV: 'production',
      DATABASE_URL: databaseUrl,
      DATA_DIR: dataDir,
      HOST: '127.0.0.1',
      PORT: String(this.port),
      TOKEN_SECRET: 'a secret for tests that is long enough, surely',
      DEMO: demo ? '1' : '0',
      DEMO_PASSWORD: demoPassword,
      SIGN_IN_ATTEMPTS: '10000',
      ...(clientDir && { CLIENT_DIR: clientDir }),
      ...settings,
    };
  }
}

/** The surroundings without what the test runner set for itself. */
function inherited(): NodeJS.ProcessEnv {
  const { JEST_WORKER_ID: _worker, NODE_OPTIONS: _options, ...rest } = process.env;
  return rest;
}
