import type { MigrationInterface, QueryRunner } from 'typeorm';
import { firstTables } from './0001-first-tables.data';

interface Step {
  /** Milliseconds of its making: steps run in this order. */
  at: number;
  name: string;
  statements: string[];
}

/** Each step in order; a step that has landed never changes, the next change is a step of its own. */
const steps: Step[] = [{ at: 1796083200000, name: 'FirstTables', statements: firstTables }];

/** One migration a statement: DDL is not transactional here, and a half-run list could not be run again. */
function migrationsOf({ at, name, statements }: Step) {
  return statements.map((statement, place) => {
    const label = `${name}${at + place}`;
    return class implements MigrationInterface {
      readonly name = label;
      async up(runner: QueryRunner): Promise<void> {
        await runner.query(statement);
      }
      async down(): Promise<void> {
        throw new Error('There is no way back; restore a backup instead.');
      }
    };
  });
}

export const migrations = steps.flatMap(migrationsOf);
