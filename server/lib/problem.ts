import type { Issue } from '../../shared/sequence/parse-result';

export interface ProblemDetail {
  fields?: { path: string; message: string }[];
  issues?: Issue[];
  current?: unknown;
  retryAfterSeconds?: number;
}

/** A refusal that is answered as `application/problem+json`: what happened, where, what to do. */
export class Refusal extends Error {
  constructor(
    readonly status: number,
    readonly code: string,
    readonly title: string,
    detail: string,
    readonly more: ProblemDetail = {},
  ) {
    super(detail);
  }
}

export const notFound = (what: string) =>
  new Refusal(404, 'not-found', 'Not found', `There is no such ${what}, or you may not see it.`);
export const forbidden = (detail: string) => new Refusal(403, 'not-allowed', 'Not allowed', detail);
export const unusable = (code: string, detail: string, more?: ProblemDetail) =>
  new Refusal(422, code, 'Cannot be used', detail, more);
export const conflict = (code: string, detail: string, more?: ProblemDetail) =>
  new Refusal(409, code, 'Clashes with what is there', detail, more);
export const stale = (current: unknown) =>
  new Refusal(
    412,
    'stale-version',
    'Changed meanwhile',
    'Somebody changed this after you read it. Look at both, then save again.',
    {
      current,
    },
  );
export const busy = (detail: string) =>
  new Refusal(503, 'busy', 'Not available for a moment', detail, { retryAfterSeconds: 2 });
