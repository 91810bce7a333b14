import { z } from 'zod';

type Shape = z.ZodType;

/** One endpoint of the API, declared once: the server's `route()` and the client's `call()` both read it. */
export interface Endpoint<
  Params extends Shape = Shape,
  Query extends Shape = Shape,
  Body extends Shape = Shape,
  Reply extends Shape = Shape,
> {
  /** Unique name, `word.act`, used in logs and in the permission test. */
  name: string;
  method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  /** Express path under `/api/v1`. */
  path: string;
  params: Params;
  query: Query;
  body: Body;
  reply: Reply;
  status: number;
  /** Needs no access token. */
  open: boolean;
  /** The request must name the version it is based on in `If-Match`. */
  versioned: boolean;
  /** How the body travels; `form` is multipart with one file. */
  encoding: 'json' | 'form';
  /** What comes back when it is not JSON. */
  replyType: 'json' | 'csv' | 'text';
}

const nothing = z.strictObject({});
type Nothing = typeof nothing;

interface Declaration<P extends Shape, Q extends Shape, B extends Shape, R extends Shape> {
  name: string;
  method: Endpoint['method'];
  path: string;
  params?: P;
  query?: Q;
  body?: B;
  reply: R;
  status?: number;
  open?: boolean;
  versioned?: boolean;
  encoding?: Endpoint['encoding'];
  replyType?: Endpoint['replyType'];
}

export function endpoint<
  R extends Shape,
  P extends Shape = Nothing,
  Q extends Shape = Nothing,
  B extends Shape = Nothing,
>(declaration: Declaration<P, Q, B, R>): Endpoint<P, Q, B, R> {
  return {
    status: declaration.method === 'POST' ? 201 : 200,
    open: false,
    versioned: false,
    encoding: 'json',
    replyType: 'json',
    ...declaration,
    params: declaration.params ?? (nothing as unknown as P),
    query: declaration.query ?? (nothing as unknown as Q),
    body: declaration.body ?? (nothing as unknown as B),
  };
}
