import type {} from 'pino-http';
import type { NextFunction, Request, RequestHandler, Response, Router } from 'express';
import type { z } from 'zod';
import type { Endpoint } from '../../shared/contracts';
import { withRequestContext } from '../lib/request-context';
import { sha256 } from '../lib/hash';
import { Refusal } from '../lib/problem';
import type { Authenticate } from './authenticate';

export interface Received<P, Q, B> {
  params: P;
  query: Q;
  body: B;
  /** Who asks; empty only on open endpoints. */
  personId: string;
  /** The version the request is based on, for endpoints that ask for it. */
  version: number;
  request: Request;
  response: Response;
}

type Handler<E extends Endpoint> = (
  received: Received<z.output<E['params']>, z.output<E['query']>, z.output<E['body']>>,
) => Promise<z.input<E['reply']>>;

export interface RegisteredRoute {
  endpoint: Endpoint;
}

const uuidPattern = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i;

function parse<S extends z.ZodType>(schema: S, value: unknown, where: string): z.output<S> {
  const result = schema.safeParse(value);
  if (result.success) return result.data;
  const fields = result.error.issues.slice(0, 50).map((fault) => ({
    path: [where, ...fault.path.map(String)].filter(Boolean).join('.'),
    message: fault.message,
  }));
  // An address that cannot be one is the same as one that leads nowhere.
  if (where === 'params') throw new Refusal(404, 'not-found', 'Not found', 'This address leads nowhere.');
  throw new Refusal(400, 'bad-request', 'Cannot be read', fields.map((field) => field.message).join(' '), {
    fields,
  });
}

function versionOf(request: Request): number {
  const header = request.get('if-match');
  const found = header ? /^"?(\d{1,9})"?$/.exec(header) : null;
  if (!found) {
    throw new Refusal(
      428,
      'version-needed',
      'Version needed',
      'Name the version your change is based on in If-Match.',
    );
  }
  return Number(found[1]);
}

function clientRequestOf(request: Request, response: Response, endpoint: Endpoint) {
  const key = request.get('idempotency-key');
  if (key === undefined || endpoint.open) return null;
  if (!uuidPattern.test(key)) {
    throw new Refusal(400, 'bad-key', 'Cannot be read', 'Idempotency-Key is a UUID of your own.');
  }
  // A form's file is not in the body: whoever took it in leaves its hash.
  const file = endpoint.encoding === 'form' ? `${String(response.locals.fileHash)}\n` : '';
  const body = `${file}${JSON.stringify(request.body ?? null)}`;
  return {
    key,
    hash: sha256(`${endpoint.name}\n${request.originalUrl}\n${request.get('if-match') ?? ''}\n${body}`),
  };
}

/** Binds endpoints of the contract to handlers: input and reply are parsed here and nowhere else. */
export class Routes {
  readonly registered: RegisteredRoute[] = [];

  constructor(
    private readonly router: Router,
    private readonly authenticate: Authenticate,
  ) {}

  add<E extends Endpoint>(endpoint: E, handler: Handler<E>, ...before: RequestHandler[]): void {
    this.registered.push({ endpoint });
    const method = endpoint.method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
    const run = async (request: Request, response: Response, _next: NextFunction) => {
      const personId = endpoint.open ? '' : String(response.locals.personId);
      const context = {
        requestId: String(request.id),
        actorId: personId || null,
        clientRequest: clientRequestOf(request, response, endpoint),
      };
      const reply = await withRequestContext(context, async () => {
        const received = {
          params: parse(endpoint.params, request.params, 'params'),
          query: parse(endpoint.query, request.query, 'query'),
          body: parse(endpoint.body, request.body ?? {}, ''),
          personId,
          version: endpoint.versioned ? versionOf(request) : 0,
          request,
          response,
        };
        return handler(received as Parameters<typeof handler>[0]);
      });
      if (endpoint.replyType !== 'json') {
        response.status(endpoint.status).type(endpoint.replyType).send(reply);
        return;
      }
      response.status(endpoint.status).json(endpoint.reply.parse(reply));
    };
    const guard: RequestHandler[] = endpoint.open ? [] : [this.authenticate.required];
    this.router[method](endpoint.path, ...guard, ...before, run);
  }
}
