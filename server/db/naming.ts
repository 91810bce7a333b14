import { DefaultNamingStrategy } from 'typeorm';

const snake = (name: string) =>
  name.replace(/[A-Z]/g, (letter) => `_${letter.toLowerCase()}`).replace(/^_/, '');

/** `createdAt` in code is `created_at` in the table. */
export class SnakeNaming extends DefaultNamingStrategy {
  override tableName(target: string, given: string | undefined): string {
    return given ?? snake(target);
  }
  override columnName(property: string, given: string | undefined): string {
    return given ?? snake(property);
  }
}
