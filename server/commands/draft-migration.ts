import { writeFileSync } from 'node:fs';
import mysql from 'mysql2/promise';
import { createDataSource } from '../db';
import { moduleEntities } from '../module-entities';

/**
 * Prints what the tables lack against the entities, as a data file for `server/db/migrations`.
 *   DATABASE_URL=… node --import tsx server/commands/draft-migration.ts FILE NAME
 * Works in a scratch database of its own on that server.
 */
async function draft(file: string, name: string): Promise<void> {
  const server = process.env.DATABASE_URL;
  if (!server) throw new Error('DATABASE_URL says on which server to draft.');
  const scratch = 'locant_draft_migration';
  const connection = await mysql.createConnection({ uri: server });
  await connection.query(`DROP DATABASE IF EXISTS ${scratch}`);
  await connection.query(`CREATE DATABASE ${scratch} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
  const url = new URL(server);
  url.pathname = `/${scratch}`;
  const source = createDataSource(url.toString(), moduleEntities);
  try {
    await source.initialize();
    await source.runMigrations();
    const { upQueries } = await source.driver.createSchemaBuilder().log();
    const statements = upQueries.map(({ query }) => query);
    const lines = statements.map((statement) => `  ${JSON.stringify(statement)},`);
    writeFileSync(file, `// prettier-ignore\nexport const ${name}: string[] = [\n${lines.join('\n')}\n];\n`);
    console.log(`${statements.length} statements`);
  } finally {
    if (source.isInitialized) await source.destroy();
    await connection.query(`DROP DATABASE IF EXISTS ${scratch}`);
    await connection.end();
  }
}

const [file = '', name = ''] = process.argv.slice(2);
void draft(file, name);
