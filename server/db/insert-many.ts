import type { EntityManager, EntityTarget, ObjectLiteral, QueryDeepPartialEntity } from 'typeorm';

/** The database takes statements up to 16 MiB; rows of text are gathered well below that. */
const mostCharacters = 2_000_000;
const mostRows = 1000;

const lengthOf = (row: object): number =>
  Object.values(row).reduce<number>(
    (sum, value) =>
      sum + (typeof value === 'string' ? value.length : value && typeof value === 'object' ? 200 : 8),
    0,
  );

/** Inserts many rows in few statements, none of them too long to be taken. */
export async function insertMany<Row extends ObjectLiteral>(
  manager: EntityManager,
  entity: EntityTarget<Row>,
  rows: readonly QueryDeepPartialEntity<Row>[],
): Promise<void> {
  let batch: QueryDeepPartialEntity<Row>[] = [];
  let characters = 0;
  const flush = async () => {
    if (batch.length > 0)
      await manager.createQueryBuilder().insert().into(entity).values(batch).updateEntity(false).execute();
    batch = [];
    characters = 0;
  };
  for (const row of rows) {
    const length = lengthOf(row);
    if (batch.length >= mostRows || (batch.length > 0 && characters + length > mostCharacters)) await flush();
    batch.push(row);
    characters += length;
  }
  await flush();
}
