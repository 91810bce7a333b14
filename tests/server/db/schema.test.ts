import mysql from 'mysql2/promise';
import { createDataSource, migrate } from '@/server/db';
import { moduleEntities } from '@/server/module-entities';
import { createFreshDatabase, type FreshDatabase } from '@/tests/support/fresh-database';

let database: FreshDatabase;
beforeAll(async () => {
  database = await createFreshDatabase();
});
afterAll(() => database.drop());

test('after the migrations the tables are what the entities say: nothing is left to change', async () => {
  const source = createDataSource(database.url, moduleEntities);
  await source.initialize();
  await migrate(source);
  const { upQueries } = await source.driver.createSchemaBuilder().log();
  expect(upQueries.map(({ query }) => query)).toEqual([]);
  await source.destroy();
});

test('several processes that start at once change the tables once', async () => {
  const fresh = await createFreshDatabase();
  const sources = [1, 2, 3].map(() => createDataSource(fresh.url, moduleEntities));
  await Promise.all(sources.map((source) => source.initialize()));
  await Promise.all(sources.map((source) => migrate(source)));
  const [rows] = await (sources[0]?.query(
    'SELECT COUNT(*) AS steps, COUNT(DISTINCT name) AS names FROM migrations',
  ) ?? []);
  const { steps, names } = rows as unknown as { steps: string; names: string };
  expect(steps).toBe(names);
  await Promise.all(sources.map((source) => source.destroy()));
  await fresh.drop();
});

// Traps of the database: labels, hashes and names of files compare byte by byte; moments are kept in UTC.
test('residue text, labels and hashes are compared byte by byte', async () => {
  const connection = await mysql.createConnection({ uri: database.url });
  const [rows] = await connection.query(
    `SELECT TABLE_NAME tableName, COLUMN_NAME columnName, COLLATION_NAME collation FROM information_schema.COLUMNS
      WHERE TABLE_SCHEMA = DATABASE() AND COLLATION_NAME IS NOT NULL`,
  );
  await connection.end();
  const collationOf = new Map(
    (rows as { tableName: string; columnName: string; collation: string }[]).map((row) => [
      `${row.tableName}.${row.columnName}`,
      row.collation,
    ]),
  );
  for (const column of [
    'protein.residues',
    'protein.residues_hash',
    'protein.organism',
    'family.name',
    'numbering_segment.suffix',
    'chain.author_id',
    'chain.observed',
    'alignment_row.text',
    'stored_file.hash',
    'upload.file_name',
    'session.token_hash',
    'thread.subject_key',
    'construct_revision.bases',
    'mutation.old_residues',
  ]) {
    expect([column, collationOf.get(column)]).toEqual([column, expect.stringMatching(/_bin$/)]);
  }
  expect(collationOf.get('person.email')).toMatch(/_ci$/);
});
