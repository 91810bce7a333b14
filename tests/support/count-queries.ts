// How many statements one request takes, as the database library logs them.
import type { DataSource, Logger } from 'typeorm';
import { requestContext } from '@/server/lib/request-context';

/** Statements asked within requests while `work` runs; what jobs and heartbeats ask is not counted. */
export async function countQueries(source: DataSource, work: () => Promise<unknown>): Promise<string[]> {
  const statements: string[] = [];
  const before = source.logger;
  const nothing = () => undefined;
  source.logger = {
    logQuery: (query: string) => {
      if (requestContext()) statements.push(query);
    },
    logQueryError: nothing,
    logQuerySlow: nothing,
    logSchemaBuild: nothing,
    logMigration: nothing,
    log: nothing,
  } satisfies Logger;
  try {
    await work();
  } finally {
    source.logger = before;
  }
  return statements;
}
