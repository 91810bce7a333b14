// Input of a shape that is nearly right: by the schema's own description, with anything in the wrong place now and then.
import { between, pick } from '@/tests/support/random';
import { codingRecord } from '@/tests/support/stage';

type Random = () => number;

/** The part of a JSON schema that the contract's schemas make use of. */
export interface Shape {
  type?: string;
  const?: unknown;
  enum?: unknown[];
  format?: string;
  properties?: Record<string, Shape>;
  required?: string[];
  items?: Shape;
  anyOf?: Shape[];
  oneOf?: Shape[];
}

const texts = [
  '',
  ' ',
  '0',
  '-1',
  'E62Q',
  'c62',
  '\0',
  '\ud800',
  '\udc00\ud800',
  '𝛾\u200d',
  '\u202eabc',
  "' OR 1=1 --",
  '<script>alert(1)</script>',
  '=1+1',
  '../../etc/passwd',
  '%00',
  '%',
  '_',
  '{}',
  'null',
  'NaN',
  '1e308',
  'a'.repeat(10_000),
  'é'.repeat(300),
  '\n\r\t',
  '__proto__',
  'ACGTACGTAC',
  '>a\nACGT',
  '2026-02-30',
  '\uFEFF',
  '\u0000\u0001\u001f',
  '🧬'.repeat(200),
];
const numbers = [
  0,
  -0,
  1,
  -1,
  0.5,
  2,
  61,
  200,
  65_536,
  2 ** 31 - 1,
  2 ** 31,
  2 ** 32,
  2 ** 53 - 1,
  2 ** 53,
  1e308,
  -1e308,
  1e-320,
];

/** Any JSON whatever. */
export function anything(random: Random, depth = 0): unknown {
  const kind = between(random, 0, depth > 3 ? 4 : 7);
  if (kind === 0) return null;
  if (kind === 1) return random() < 0.5;
  if (kind === 2) return pick(random, numbers);
  if (kind <= 4) return pick(random, texts);
  const many = between(random, 0, 4);
  if (kind === 5) return Array.from({ length: many }, () => anything(random, depth + 1));
  const names = ['id', 'text', 'kind', '__proto__', 'constructor', '$gt', 'toString', pick(random, texts)];
  return Object.fromEntries(
    Array.from({ length: many }, () => [pick(random, names), anything(random, depth + 1)]),
  );
}

export interface Nearly {
  /** Gives real ids, so that what comes behind the first check is reached too. */
  idFor: (name: string) => string;
  /** Chance that anything stands where something of the shape should. */
  wild: number;
}

/** Mostly what the shape asks for. */
export function nearly(random: Random, shape: Shape, how: Nearly, name = ''): unknown {
  if (random() < how.wild) return anything(random);
  if (shape.const !== undefined) return shape.const;
  if (shape.enum) return pick(random, shape.enum);
  const choices = shape.anyOf ?? shape.oneOf;
  if (choices) return nearly(random, pick(random, choices), how, name);
  if (shape.properties) {
    const entries = Object.entries(shape.properties)
      .filter(([key]) => ((shape.required?.includes(key) ?? false) ? random() < 0.97 : random() < 0.6))
      .map(([key, inner]) => [key, nearly(random, inner, how, key)]);
    return Object.fromEntries(entries);
  }
  if (shape.type === 'array') {
    const length = random() < 0.9 ? between(random, 0, 3) : between(random, 0, 60);
    return Array.from({ length }, () => nearly(random, shape.items ?? {}, how));
  }
  if (name === 'codingStart' && random() < 0.7) return 1;
  if (name === 'geneticCode' && random() < 0.7) return 11;
  if (shape.type === 'integer' || shape.type === 'number')
    return random() > how.wild * 5 ? between(random, 0, 70) : pick(random, numbers);
  if (shape.type === 'boolean') return random() < 0.5;
  if (shape.type === 'string') {
    if (shape.format === 'uuid') return how.idFor(name);
    if (shape.format === 'email') return `${pick(random, ['a', 'ä', 'x'.repeat(300)])}@lab.example`;
    if (name === 'dna') return codingRecord('VIBCH_atpE').slice(0, random() < 0.7 ? undefined : 200);
    return random() > how.wild * 5
      ? pick(random, ['E62Q', 'D60Q', 'a name', 'Looks right.', '1'])
      : pick(random, texts);
  }
  return anything(random);
}
