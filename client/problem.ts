import type { z } from 'zod';
import { problem, type Problem } from '@/shared/contracts/common';

/** A refusal or a missing answer, as screens show it. `status` 0 means that no answer came. */
export class ApiProblem extends Error {
  override readonly name = 'ApiProblem';

  constructor(
    readonly problem: Problem,
    /** How long the server asks to be left alone. */
    readonly retryAfterSeconds: number | null = null,
  ) {
    super(problem.detail);
  }

  get status(): number {
    return this.problem.status;
  }

  get code(): string {
    return this.problem.code;
  }

  /** Nobody knows whether it was done: the same act may be tried again under the same key. */
  get undecided(): boolean {
    return this.status === 0 || this.status >= 500 || [408, 425, 429].includes(this.status);
  }
}

function own(status: number, code: string, title: string, detail: string): ApiProblem {
  return new ApiProblem({ type: `/problems/${code}`, title, status, code, detail, requestId: '' });
}

export const offline = (detail = 'The server does not answer. Check the connection, then try again.') =>
  own(0, 'offline', 'No connection', detail);

export const signInNeeded = () =>
  own(401, 'sign-in-needed', 'Sign in', 'Sign in first, or again: this sign-in has run out.');

export const notUnderstood = (status: number) =>
  own(
    status,
    'reply-not-understood',
    'Answer not understood',
    'The server answered in a way this page does not know. Load the page again: it may be older than the server.',
  );

const wordsForStatus: Record<number, string> = {
  401: 'This sign-in has run out. Sign in again.',
  404: 'There is nothing at this address.',
  413: 'This is larger than a server on the way takes. Send a smaller file.',
  429: 'Too many requests. Wait a moment, then try again.',
  502: 'The server is not there right now. Try again in a moment.',
  503: 'The server is busy. Try again in a moment.',
  504: 'The server took too long. Try again in a moment.',
};

/** Reads a refusal; one that a proxy wrote, in whatever form, still gets words. */
export function readProblem(status: number, text: string, retryAfter: string | null): ApiProblem {
  const seconds = retryAfter && /^\d+$/.test(retryAfter) ? Number(retryAfter) : null;
  const parsed = problem.safeParse(parseJson(text));
  if (parsed.success) return new ApiProblem({ ...parsed.data, status }, seconds);
  const detail = wordsForStatus[status] ?? `The server refused this (${status}).`;
  return new ApiProblem(own(status, `http-${status}`, 'Not done', detail).problem, seconds);
}

export function parseJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}

export function asApiProblem(error: unknown): ApiProblem {
  if (error instanceof ApiProblem) return error;
  console.error(error);
  return own(0, 'fault', 'Our fault', 'Something went wrong on this page. Try again.');
}

/** What stands there now, when somebody else changed it first; null for any other refusal. */
export function conflictOf<Shape extends z.ZodType>(error: unknown, shape: Shape): z.output<Shape> | null {
  if (!(error instanceof ApiProblem) || error.status !== 412) return null;
  const parsed = shape.safeParse(error.problem.current);
  return parsed.success ? parsed.data : null;
}
