import path from 'node:path';
import { MessageChannel } from 'node:worker_threads';
import { Piscina } from 'piscina';
import type { CandidateProtein, MappableChain } from '../../shared/sequence/mapping/chain-types';
import type { MappedChain } from '../modules/maps';
import type { AlignmentReading, StructureReading, WorkerProgress } from './workers/messages';

/** The thread that did the work is gone: it used too much memory, or fell over. Doing it again would end the same. */
export class WorkerGone extends Error {
  constructor(readonly tooMuchMemory: boolean) {
    super(tooMuchMemory ? 'The reading took too much memory.' : 'The reading broke off.');
  }
}

export type OnWorkerProgress = (progress: WorkerProgress) => void;

/** Threads that read files and lay chains on proteins, each with a limit of memory. */
export class WorkerPool {
  private readonly pool: Piscina;
  /** Tasks under way: a thread that dies before it takes its first task would leave them waiting for ever. */
  private readonly underWay = new Set<AbortController>();

  constructor(memoryMegabytes: number, threads = 2) {
    this.pool = new Piscina({
      filename: path.join(__dirname, 'workers', 'entry.cjs'),
      minThreads: 0,
      maxThreads: threads,
      idleTimeout: 30_000,
      // The entry registers the TypeScript loader by itself; a second registration here is refused by Node 20.
      execArgv: [],
      // A small young generation: what it hands over at once stays within the leeway in which a thread ends by itself
      // instead of taking the process along.
      resourceLimits: { maxOldGenerationSizeMb: memoryMegabytes, maxYoungGenerationSizeMb: 8 },
      recordTiming: false,
    });
    this.pool.on('error', (error: unknown) => {
      for (const task of this.underWay) task.abort(error instanceof Error ? error : new WorkerGone(false));
    });
  }

  readAlignment(file: string, signal: AbortSignal, onProgress: OnWorkerProgress): Promise<AlignmentReading> {
    return this.run('readAlignmentFile', { file }, signal, onProgress);
  }

  readStructure(
    file: string,
    candidates: readonly CandidateProtein[],
    signal: AbortSignal,
    onProgress: OnWorkerProgress,
  ): Promise<StructureReading> {
    return this.run('readStructureFile', { file, candidates }, signal, onProgress);
  }

  mapChain(chain: MappableChain, protein: CandidateProtein): Promise<MappedChain | null> {
    return this.run('mapOneChain', { chain, protein }, undefined, () => {});
  }

  async close(): Promise<void> {
    await this.pool.destroy();
  }

  private async run<Reply>(
    name: string,
    input: object,
    signal: AbortSignal | undefined,
    onProgress: OnWorkerProgress,
  ): Promise<Reply> {
    const { port1, port2 } = new MessageChannel();
    port1.on('message', onProgress);
    const failed = new AbortController();
    const either = signal ? AbortSignal.any([signal, failed.signal]) : failed.signal;
    this.underWay.add(failed);
    try {
      const task = { ...input, port: port2 };
      return (await this.pool.run(task, { name, transferList: [port2], signal: either })) as Reply;
    } catch (error) {
      throw translated(error, either);
    } finally {
      this.underWay.delete(failed);
      port1.close();
    }
  }
}

/** Our own tasks never throw on bad input, so an error is the end of a thread, or a fault of ours. */
function translated(error: unknown, signal: AbortSignal): unknown {
  if (signal.aborted) return signal.reason instanceof Error ? signal.reason : error;
  const { code, message = '' } = (error ?? {}) as { code?: string; message?: string };
  if (code === 'ERR_WORKER_OUT_OF_MEMORY') return new WorkerGone(true);
  // Texts and arrays outside the heap are refused by the engine with these words.
  if (/invalid (string|array|typed array) length|array buffer allocation failed/i.test(message))
    return new WorkerGone(true);
  if (/worker (exited|terminated|stopped)|terminating worker/i.test(message)) return new WorkerGone(false);
  return error;
}
