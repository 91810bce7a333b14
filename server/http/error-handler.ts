import type {} from 'pino-http';
import type { ErrorRequestHandler, Response } from 'express';
import type { Problem } from '../../shared/contracts';
import { isConnectionLost, isDuplicate } from '../lib/database-errors';
import { busy, conflict, notFound, Refusal } from '../lib/problem';

const nothingMore = new Set(['entity.parse.failed', 'encoding.unsupported', 'charset.unsupported']);

/** Errors of the body readers have a type or a code of their own. */
function refusalOf(error: unknown): Refusal | null {
  if (error instanceof Refusal) return error;
  if (isConnectionLost(error)) return busy('The database does not answer. Try again in a moment.');
  if (isDuplicate(error)) {
    return conflict('made-meanwhile', 'Somebody made the same thing a moment ago. Read again, then decide.');
  }
  const { type, status, code } = (error ?? {}) as { type?: string; status?: number; code?: string };
  // Files that are gone, paths that lead out of the folder, addresses that cannot be decoded.
  if (status === 404 || status === 403 || error instanceof URIError) return notFound('address');
  if (type === 'entity.too.large') {
    return new Refusal(
      413,
      'too-large',
      'Too large',
      'This is larger than a request may be. Send less at once.',
    );
  }
  if (type && nothingMore.has(type)) {
    return new Refusal(400, 'bad-request', 'Cannot be read', 'The body of the request is not readable JSON.');
  }
  if (code === 'LIMIT_FILE_SIZE') {
    return new Refusal(413, 'file-too-large', 'Too large', 'The file is larger than this server takes.');
  }
  if (code?.startsWith('LIMIT_') || (status === 400 && error instanceof Error)) {
    return new Refusal(
      400,
      'bad-request',
      'Cannot be read',
      'The form is not as it should be: one file and its fields.',
    );
  }
  return null;
}

export function sendProblem(response: Response, requestId: string, refusal: Refusal): void {
  const { retryAfterSeconds, ...more } = refusal.more;
  const problem: Problem = {
    type: `/problems/${refusal.code}`,
    title: refusal.title,
    status: refusal.status,
    code: refusal.code,
    detail: refusal.message,
    requestId,
    ...more,
  };
  if (retryAfterSeconds) response.set('Retry-After', String(retryAfterSeconds));
  response.status(refusal.status).type('application/problem+json').send(JSON.stringify(problem));
}

export const errorHandler: ErrorRequestHandler = (error: unknown, request, response, _next) => {
  const refusal =
    refusalOf(error) ??
    new Refusal(
      500,
      'fault',
      'Our fault',
      'Something went wrong here. Nothing was half-stored; try again, and tell us the request id if it stays.',
    );
  if (refusal.status >= 500) request.log?.error({ err: error }, 'request failed');
  if (response.headersSent) {
    response.destroy();
    return;
  }
  sendProblem(response, String(request.id), refusal);
};
