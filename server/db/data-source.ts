import 'reflect-metadata';
import { DataSource, type EntityTarget, type ObjectLiteral } from 'typeorm';
import * as machinery from './entities';
import { migrations } from './migrations';
import { SnakeNaming } from './naming';

/** The one pool of connections. Entities of the modules are handed in, so that this room knows none of them. */
export function createDataSource(url: string, entities: EntityTarget<ObjectLiteral>[]): DataSource {
  return new DataSource({
    type: 'mariadb',
    url,
    charset: 'utf8mb4_unicode_ci',
    timezone: 'Z',
    poolSize: 12,
    connectTimeout: 4000,
    entities: [...Object.values(machinery), ...entities] as never[],
    migrations,
    migrationsTransactionMode: 'none',
    namingStrategy: new SnakeNaming(),
    synchronize: false,
    extra: { connectionLimit: 12, maxIdle: 12, enableKeepAlive: true },
  });
}
