import { existsSync } from 'node:fs';
import { copyFile, mkdtemp, rm, writeFile } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { WorkerPool } from '@/server/jobs';

jest.setTimeout(60_000);

const fixture = (name: string) => path.join(__dirname, '..', '..', 'fixtures', name);

describe('worker threads', () => {
  let folder: string;
  beforeAll(async () => {
    folder = await mkdtemp(path.join(os.tmpdir(), 'locant-workers-'));
  });
  afterAll(() => rm(folder, { recursive: true, force: true }));

  it('read an alignment and a coordinate file away from the main thread, telling how far they are', async () => {
    const pool = new WorkerPool(400, 1);
    try {
      const told: string[] = [];
      const signal = new AbortController().signal;
      const alignment = await pool.readAlignment(
        fixture('alignments/c_small_mafft.afa'),
        signal,
        ({ stage }) => told.push(stage),
      );
      expect(alignment.value?.rows).toHaveLength(5);
      const candidates = (alignment.value?.rows ?? []).map((row) => ({
        id: row.name,
        name: row.name,
        family: 'c',
        residues: row.residues,
      }));
      const structure = await pool.readStructure(
        fixture('structures/4bem.pdb'),
        candidates,
        signal,
        ({ stage }) => told.push(stage),
      );
      expect(structure.value?.chains.length).toBeGreaterThan(9);
      expect(told).toContain('map');
    } finally {
      await pool.close();
    }
  });

  it('run out of memory without taking the server along', async () => {
    const file = path.join(folder, 'large.afa');
    const row = (at: number) => `>row${at}\n${'ACDEFGHIKLMNPQRSTVWY'.repeat(100)}\n`;
    await writeFile(file, Array.from({ length: 25_000 }, (_, at) => row(at)).join(''));
    const pool = new WorkerPool(64, 1);
    try {
      const signal = new AbortController().signal;
      await expect(pool.readAlignment(file, signal, () => {})).rejects.toMatchObject({ tooMuchMemory: true });
      const small = path.join(folder, 'small.afa');
      await copyFile(fixture('alignments/c_small_mafft.afa'), small);
      expect(existsSync(small)).toBe(true);
      expect((await pool.readAlignment(small, signal, () => {})).value?.columnCount).toBeGreaterThan(70);
    } finally {
      await pool.close();
    }
  });

  it('stop when they are told to', async () => {
    const pool = new WorkerPool(400, 1);
    try {
      const stop = new AbortController();
      const reading = pool.readStructure(fixture('structures/1cow.pdb'), [], stop.signal, () => {});
      stop.abort(new Error('stopped'));
      await expect(reading).rejects.toThrow('stopped');
    } finally {
      await pool.close();
    }
  });
});
