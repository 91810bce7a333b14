import { withRequestContext } from '../lib/request-context';
import type { Logger } from '../lib/log';
import { LeaseLost, type ClaimedJob, type JobControl, type JobHandler } from './job-handler';
import type { JobQueue, Progress } from './job-queue';

interface Settings {
  /** Jobs done at the same time in this process. */
  concurrency: number;
  /** How often the queue is asked when nobody wakes the runner. */
  pollMilliseconds: number;
  /** A job that fails after being taken so often is given up. */
  attempts: number;
  /** So is one that was taken so often while its processes died: it may be what brings them down. */
  deaths: number;
  /** Wait before the second attempt; it doubles with each further one. */
  firstWaitMilliseconds: number;
}

const usual: Settings = {
  concurrency: 2,
  pollMilliseconds: 1000,
  attempts: 4,
  deaths: 20,
  firstWaitMilliseconds: 1000,
};

/** Takes jobs and does them until it is stopped. Any process may die at any time: the leases of its jobs run out. */
export class JobRunner {
  private readonly settings: Settings;
  private readonly running = new Set<Promise<void>>();
  private readonly stopping = new AbortController();
  private loop: Promise<void> | null = null;
  private ring: () => void = () => {};

  constructor(
    private readonly queue: JobQueue,
    private readonly handlers: Readonly<Record<string, JobHandler>>,
    private readonly log: Logger,
    settings: Partial<Settings> = {},
  ) {
    this.settings = { ...usual, ...settings };
  }

  start(): void {
    this.loop ??= this.takeUntilStopped();
  }

  /** There may be something to do. */
  wake(): void {
    this.ring();
  }

  /** Takes no more; jobs under way are cut off and given back for others to take. */
  async stop(): Promise<void> {
    this.stopping.abort();
    this.ring();
    await this.loop;
    await Promise.all(this.running);
  }

  private async takeUntilStopped(): Promise<void> {
    while (!this.stopping.signal.aborted) {
      const rung = new Promise<void>((ring) => (this.ring = ring));
      try {
        await this.queue.releaseExpired();
        await this.takeWhatIsDue();
      } catch (error) {
        // The database may be away for a moment; the next round asks again.
        this.log.warn({ err: error }, 'jobs cannot be taken');
      }
      let timer: NodeJS.Timeout | undefined;
      const polled = new Promise<void>((done) => (timer = setTimeout(done, this.settings.pollMilliseconds)));
      await Promise.race([rung, polled, ...(this.isFull() ? this.running : [])]);
      clearTimeout(timer);
    }
  }

  private isFull(): boolean {
    return this.running.size >= this.settings.concurrency;
  }

  private async takeWhatIsDue(): Promise<void> {
    while (!this.stopping.signal.aborted && !this.isFull()) {
      const job = await this.queue.claim();
      if (!job) return;
      const work = this.perform(job).finally(() => {
        this.running.delete(work);
        this.ring();
      });
      this.running.add(work);
    }
  }

  /** Never rejects. */
  private async perform(job: ClaimedJob): Promise<void> {
    const lost = new AbortController();
    const signal = AbortSignal.any([lost.signal, this.stopping.signal]);
    let progress: Progress = { stage: '', done: 0, total: 0 };
    const beat = setInterval(
      () => {
        this.queue.heartbeat(job, progress).then(
          (kept) => kept || lost.abort(new LeaseLost()),
          (error: unknown) => this.log.warn({ err: error, job: job.id }, 'heartbeat failed'),
        );
      },
      Math.min(2000, this.queue.leaseMilliseconds / 3),
    );
    const control = (end: 'done' | 'failed'): JobControl => ({
      signal,
      progress: (stage, done, total) => (progress = { stage, done, total }),
      complete: (unit) => this.queue.complete(unit, job, end),
    });
    // Nothing of the request that happened to wake the runner may reach the job.
    const context = { requestId: `job-${job.id}`, actorId: null, clientRequest: null };
    try {
      await withRequestContext(context, () => this.attempt(job, control('done'), control('failed')));
    } catch (error) {
      await this.afterFailure(job, error);
    } finally {
      clearInterval(beat);
    }
  }

  private attempt(job: ClaimedJob, done: JobControl, failed: JobControl): Promise<void> {
    const handler = this.handlers[job.kind];
    if (!handler) throw new Error(`Nobody does jobs of the kind ${job.kind}.`);
    const { attempts, deaths } = this.settings;
    const isHopeless = job.attempts > (job.failed ? attempts : deaths);
    return isHopeless ? handler.giveUp(job, failed) : handler.run(job, done);
  }

  private async afterFailure(job: ClaimedJob, error: unknown): Promise<void> {
    if (error instanceof LeaseLost) return;
    const stopped = this.stopping.signal.aborted;
    if (!stopped) this.log.error({ err: error, job: job.id, kind: job.kind }, 'job failed');
    const wait = stopped ? 0 : this.settings.firstWaitMilliseconds * 2 ** Math.min(job.attempts - 1, 6);
    const words = error instanceof Error ? `${error.name}: ${error.message}` : String(error);
    // When the database is away too, the lease runs out by itself.
    await this.queue.release(job, wait, stopped ? null : words.slice(0, 2000)).catch(() => {});
  }
}
