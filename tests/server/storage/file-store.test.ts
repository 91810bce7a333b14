import { createHash, randomBytes } from 'node:crypto';
import { readdirSync, readFileSync, statSync } from 'node:fs';
import { mkdtemp, rm } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { Readable } from 'node:stream';
import { FileStore } from '@/server/storage';

describe('the store of files', () => {
  let folder: string;
  let store: FileStore;
  beforeEach(async () => {
    folder = await mkdtemp(path.join(os.tmpdir(), 'locant-files-'));
    store = new FileStore(folder);
  });
  afterEach(() => rm(folder, { recursive: true, force: true }));

  it('keeps bytes under their hash, once', async () => {
    const bytes = randomBytes(300_000);
    const hash = createHash('sha256').update(bytes).digest('hex');
    for (let times = 0; times < 2; times += 1) {
      const received = await store.receive(
        Readable.from([bytes.subarray(0, 70_000), bytes.subarray(70_000)]),
      );
      expect(received).toMatchObject({ hash, bytes: 300_000 });
      await store.keep(received);
    }
    const place = path.join(folder, 'files', hash.slice(0, 2), hash.slice(2));
    expect(store.pathOf(hash)).toBe(place);
    expect(readFileSync(place).equals(bytes)).toBe(true);
    expect(statSync(place).mode & 0o077).toBe(0);
    expect(readdirSync(path.join(folder, 'files', 'incoming'))).toEqual([]);
  });

  it('leaves nothing behind when a stream breaks, or what came is not kept', async () => {
    const breaking = new Readable({
      read() {
        this.push(randomBytes(1000));
        this.destroy(new Error('cut off'));
      },
    });
    await expect(store.receive(breaking)).rejects.toThrow('cut off');
    const received = await store.receive(Readable.from([randomBytes(10)]));
    await store.discard(received);
    await store.discard(received);
    expect(readdirSync(path.join(folder, 'files', 'incoming'))).toEqual([]);
  });

  it('has no place for what is not a hash', () => {
    for (const name of ['', '../../etc/passwd', 'A'.repeat(64), `${'0'.repeat(63)}/`])
      expect(() => store.pathOf(name)).toThrow('Not the hash');
  });
});
