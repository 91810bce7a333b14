import { readFileSync } from 'node:fs';
import { join } from 'node:path';

const folder = join(__dirname, '..', 'fixtures');

/** Text of a file in tests/fixtures. */
export function readFixtureText(name: string): string {
  return readFileSync(join(folder, name), 'utf8');
}

/** A JSON file in tests/fixtures, in the shape the test states. */
export function readFixtureJson<Shape>(name: string): Shape {
  return JSON.parse(readFixtureText(name)) as Shape;
}
