import { z } from 'zod';

const kinds: Readonly<Record<string, string>> = {
  string: 'text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'true or false',
  array: 'a list',
  object: 'an object',
};
const unit = (origin: string, limit: number | bigint): string =>
  origin === 'string'
    ? `${limit} characters`
    : origin === 'array'
      ? `${limit} ${Number(limit) === 1 ? 'entry' : 'entries'}`
      : `${limit}`;
const holds = (origin: string): string =>
  origin === 'string' || origin === 'array' ? 'must have' : 'must be';
const nameOf = (path: readonly PropertyKey[] | undefined): string =>
  path && path.length > 0 ? path.map(String).join('.') : 'This';

/** What is wrong with a value in plain words, wherever a schema has no words of its own for it. */
function plainWords(issue: z.core.$ZodRawIssue): string | undefined {
  const name = nameOf(issue.path);
  switch (issue.code) {
    case 'invalid_type':
      if (issue.input === undefined) return `${name} is missing.`;
      return `${name} must be ${kinds[issue.expected] ?? issue.expected}.`;
    case 'unrecognized_keys':
      return `Not known here: ${issue.keys.join(', ')}.`;
    case 'invalid_value':
      return `${name} must be one of: ${issue.values.map(String).join(', ')}.`;
    case 'too_big':
      return `${name} ${holds(issue.origin)} at most ${unit(issue.origin, issue.maximum)}.`;
    case 'too_small':
      return `${name} ${holds(issue.origin)} at least ${unit(issue.origin, issue.minimum)}.`;
    case 'invalid_format':
      return `${name} is not in the expected form (${issue.format}).`;
    default:
      return undefined;
  }
}

z.config({ customError: plainWords });
