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

  constructor(memoryMegabytes: number, threads = 2) {
    this.pool = new Piscina({
      filename: path.join(__dirname, 'workers', 'entry.cjs'),
      minThreads: 0,
      maxThreads: threads,
      idleTimeout: 30_000,
      // The entry registers the TypeScript loader by itself; a second registration here is refused by Node 20.
      execArgv: [],
      resourceLimits: { maxOldGenerationSizeMb: memoryMegabytes },
      recordTiming: false,
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
    try {
      return (await this.pool.run(
        { ...input, port: port2 },
        { name, transferList: [port2], ...(signal && { signal }) },
      )) as Reply;
    } catch (error) {
      throw translated(error, signal);
    } finally {
      port1.close();
    }
  }
}

/** Our own tasks never throw on bad input, so an error is the end of a thread, or a fault of ours. */
function translated(error: unknown, signal: AbortSignal | undefined): unknown {
  if (signal?.aborted) return signal.reason instanceof Error ? signal.reason : error;
  const { code, message = '' } = (error ?? {}) as { code?: string; message?: string };
  if (code === 'ERR_WORKER_OUT_OF_MEMORY') return new WorkerGone(true);
  // Texts and arrays outside the heap are refused by the engine with these words.
  if (/invalid (string|array|typed array) length|array buffer allocation failed/i.test(message))
    return new WorkerGone(true);
  if (/worker (exited|terminated|stopped)|terminating worker/i.test(message)) return new WorkerGone(false);
  return error;
}
