import { createHash } from 'node:crypto';
import { createWriteStream } from 'node:fs';
import { mkdir, readdir, rename, rm, stat } from 'node:fs/promises';
import path from 'node:path';
import { Transform, type Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { newId } from '../lib/new-id';

/** Bytes that have arrived whole but have no place yet: `keep` or `discard` them. */
export interface ReceivedFile {
  /** sha-256, in hex. */
  hash: string;
  bytes: number;
  temporaryPath: string;
}

/** No upload writes nothing for so long: such a temporary file was left by a process that died. */
const leftOverAfterMilliseconds = 60 * 60_000;

/** Files by the hash of their content. Nothing is ever changed in place; what is kept twice is stored once. */
export class FileStore {
  private readonly files: string;
  private readonly incoming: string;

  constructor(dataFolder: string) {
    this.files = path.resolve(dataFolder, 'files');
    // On the same disk, so that moving into place is one step that cannot be seen half done.
    this.incoming = path.resolve(dataFolder, 'files', 'incoming');
  }

  /** Streams to a temporary file while hashing; leaves nothing behind when the stream breaks. */
  async receive(stream: Readable): Promise<ReceivedFile> {
    await mkdir(this.incoming, { recursive: true, mode: 0o700 });
    const temporaryPath = path.join(this.incoming, newId());
    const hash = createHash('sha256');
    let bytes = 0;
    const measure = new Transform({
      transform(chunk: Buffer, _encoding, done) {
        hash.update(chunk);
        bytes += chunk.length;
        done(null, chunk);
      },
    });
    try {
      // Flushed to the disk before it counts as received: the row must never point to bytes that a crash lost.
      await pipeline(stream, measure, createWriteStream(temporaryPath, { mode: 0o600, flush: true }));
    } catch (error) {
      await rm(temporaryPath, { force: true });
      throw error;
    }
    return { hash: hash.digest('hex'), bytes, temporaryPath };
  }

  /** Moves received bytes to the place of their hash. */
  async keep(file: ReceivedFile): Promise<void> {
    const place = this.pathOf(file.hash);
    await mkdir(path.dirname(place), { recursive: true, mode: 0o700 });
    await rename(file.temporaryPath, place);
  }

  /** Removes the temporary file, if it still is one. */
  async discard(file: Pick<ReceivedFile, 'temporaryPath'>): Promise<void> {
    await rm(file.temporaryPath, { force: true });
  }

  /** Removes temporary files that a process left which was killed; gives how many. */
  async sweep(now = Date.now()): Promise<number> {
    const names = await readdir(this.incoming).catch(() => []);
    let swept = 0;
    for (const name of names) {
      const file = path.join(this.incoming, name);
      const found = await stat(file).catch(() => null);
      if (!found || now - found.mtimeMs < leftOverAfterMilliseconds) continue;
      await rm(file, { force: true });
      swept += 1;
    }
    return swept;
  }

  /** Where the bytes of this hash are; only a row of a project may be the reason to ask. */
  pathOf(hash: string): string {
    if (!/^[0-9a-f]{64}$/.test(hash)) throw new Error('Not the hash of a stored file.');
    return path.join(this.files, hash.slice(0, 2), hash.slice(2));
  }
}
