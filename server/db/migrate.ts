import type { DataSource } from 'typeorm';

const lockName = 'locant-migrations';
const waitSeconds = 60;

/** Brings the tables up to date; of several processes that start at once, one does it and the others wait. */
export async function migrate(source: DataSource): Promise<void> {
  const runner = source.createQueryRunner();
  try {
    const [{ taken }] = (await runner.query('SELECT GET_LOCK(?, ?) taken', [lockName, waitSeconds])) as [
      { taken: number | string | null },
    ];
    if (Number(taken) !== 1) throw new Error('Another process is changing the tables and does not finish.');
    await source.runMigrations();
  } finally {
    await runner.query('SELECT RELEASE_LOCK(?)', [lockName]).catch(() => undefined);
    await runner.release();
  }
}
