import type { z } from 'zod';
import type { Endpoint } from '@/shared/contracts/endpoint';

type Nothing = Record<never, never>;
type Given<Name extends string, Value> = Nothing extends Value
  ? { [K in Name]?: Value }
  : { [K in Name]: Value };

/** What a call of this endpoint needs, by inference from its declaration. */
export type CallOptions<E extends Endpoint> = Given<'params', z.input<E['params']>> &
  Given<'query', z.input<E['query']>> &
  Given<'body', z.input<E['body']>> & {
    /** The version the change is based on; asked for by versioned endpoints. */
    version?: number;
    /** Stays the same over every retry of one act. */
    idempotencyKey?: string;
    signal?: AbortSignal;
  };

/** The same without inference, for the parts that only pass it on. */
export interface LooseOptions {
  params?: unknown;
  query?: unknown;
  body?: unknown;
  version?: number;
  idempotencyKey?: string;
  signal?: AbortSignal;
}

const base = '/api/v1';

function entries(value: unknown): [string, unknown][] {
  return Object.entries((value ?? {}) as Record<string, unknown>);
}

/** The address of a call, with every part escaped. Query members that are undefined are left out. */
export function addressOf(endpoint: Endpoint, { params, query }: LooseOptions): string {
  const given = new Map(entries(params));
  const path = endpoint.path.replace(/:(\w+)/g, (_all, name: string) => {
    if (given.get(name) === undefined) throw new Error(`${endpoint.name} needs ${name}.`);
    return encodeURIComponent(String(given.get(name)));
  });
  const search = new URLSearchParams(
    entries(query)
      .filter(([, value]) => value !== undefined)
      .map(([name, value]) => [name, String(value)]),
  ).toString();
  return `${base}${path}${search ? `?${search}` : ''}`;
}

/** The headers of a call. Every writing call carries a key, so that sending it twice does it once. */
export function headersOf(
  endpoint: Endpoint,
  { version, idempotencyKey }: LooseOptions,
  accessToken: string | null,
): Record<string, string> {
  const headers: Record<string, string> = { Accept: 'application/json, application/problem+json, text/*' };
  if (accessToken) headers.Authorization = `Bearer ${accessToken}`;
  if (idempotencyKey) headers['Idempotency-Key'] = idempotencyKey;
  if (endpoint.versioned) {
    if (version === undefined) throw new Error(`${endpoint.name} needs the version the change is based on.`);
    headers['If-Match'] = `"${version}"`;
  }
  if (endpoint.method !== 'GET' && endpoint.encoding === 'json') headers['Content-Type'] = 'application/json';
  return headers;
}
