// Errors of the database put in at a chosen statement of a unit of work, as the driver would give them.
import type { DataSource } from 'typeorm';
import { QueryFailedError } from 'typeorm';
import { requestContext } from '@/server/lib/request-context';

export type Fault = 'deadlock' | 'lock wait' | 'row changed' | 'lost before' | 'lost after';

const errors: Record<Fault, { errno?: number; code: string }> = {
  deadlock: { errno: 1213, code: 'ER_LOCK_DEADLOCK' },
  'lock wait': { errno: 1205, code: 'ER_LOCK_WAIT_TIMEOUT' },
  'row changed': { errno: 1020, code: 'ER_CHECKREAD' },
  'lost before': { code: 'PROTOCOL_CONNECTION_LOST' },
  'lost after': { code: 'PROTOCOL_CONNECTION_LOST' },
};

interface Runner {
  isTransactionActive: boolean;
  connect(): Promise<{ destroy(): void }>;
  query(sql: string, ...rest: unknown[]): Promise<unknown>;
}

/** Stands between the units of a server and its driver; what is asked outside a unit or by jobs goes through. */
export class DatabaseFaults {
  private readonly original: Runner['query'];
  private readonly prototype: Runner;
  private seen: string[] = [];
  private armed: { at: number | 'COMMIT'; fault: Fault } | null = null;
  struck = false;

  constructor(source: DataSource) {
    this.prototype = Object.getPrototypeOf(source.createQueryRunner()) as Runner;
    const original = (this.original = this.prototype.query);
    const take = (sql: string) => this.take(sql);
    this.prototype.query = async function query(this: Runner, sql: string, ...rest: unknown[]) {
      const fault = this.isTransactionActive && requestContext() ? take(sql) : null;
      if (fault === null) return original.call(this, sql, ...rest);
      if (fault === 'lost after') await original.call(this, sql, ...rest);
      // A deadlock and a changed row undo the transaction; after a lock wait it is still there.
      if (fault === 'deadlock' || fault === 'row changed') await original.call(this, 'ROLLBACK');
      if (fault === 'lost before' || fault === 'lost after') (await this.connect()).destroy();
      throw new QueryFailedError(sql, [], Object.assign(new Error(`put in: ${fault}`), errors[fault]));
    };
  }

  /** Counts the statements of what is asked next; with a fault, that one fails, once. */
  arm(at: number | 'COMMIT', fault: Fault | null): void {
    this.seen = [];
    this.struck = false;
    this.armed = fault ? { at, fault } : null;
  }

  get statements(): readonly string[] {
    return this.seen;
  }

  restore(): void {
    this.prototype.query = this.original;
  }

  private take(sql: string): Fault | null {
    this.seen.push(sql);
    if (this.armed === null || (this.armed.at !== this.seen.length && this.armed.at !== sql)) return null;
    const { fault } = this.armed;
    this.armed = null;
    this.struck = true;
    return fault;
  }
}
