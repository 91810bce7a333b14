import type { z } from 'zod';
import { auth } from '@/shared/contracts/auth';
import type { Endpoint } from '@/shared/contracts/endpoint';
import { access, type Access } from './access';
import { newId } from './new-id';
import { notUnderstood, offline, parseJson, readProblem } from './problem';
import { renewal, type Renewal } from './renewal';
import { addressOf, headersOf, type CallOptions, type LooseOptions } from './request';

export interface ApiTools {
  access: Access;
  fetch: (address: string, init: RequestInit) => Promise<Response>;
  locks?: LockManager;
  /** Longer silence counts as no connection: a half-open line looks online for long. */
  patienceMilliseconds?: number;
}

export interface DownloadedText {
  text: string;
  fileName: string | null;
}

export interface Api {
  call: <E extends Endpoint>(endpoint: E, options: CallOptions<E>) => Promise<z.output<E['reply']>>;
  downloadText: <E extends Endpoint>(endpoint: E, options: CallOptions<E>) => Promise<DownloadedText>;
  renewal: Renewal;
}

/** The only way to the server's API. Replies are parsed with the contract; refusals are thrown as `ApiProblem`. */
export function createApi({ access, fetch, locks, patienceMilliseconds = 30_000 }: ApiTools): Api {
  async function send(endpoint: Endpoint, options: LooseOptions, token: string | null) {
    const patience = new AbortController();
    const giveUp = () => patience.abort();
    const timer = setTimeout(giveUp, patienceMilliseconds);
    if (options.signal?.aborted) giveUp();
    options.signal?.addEventListener('abort', giveUp);
    try {
      const response = await fetch(addressOf(endpoint, options), {
        method: endpoint.method,
        headers: headersOf(endpoint, options, token),
        body: endpoint.method === 'GET' ? undefined : JSON.stringify(options.body ?? {}),
        credentials: 'same-origin',
        signal: patience.signal,
      });
      return { response, text: await response.text() };
    } catch (error) {
      if (options.signal?.aborted) throw error;
      throw offline();
    } finally {
      clearTimeout(timer);
      options.signal?.removeEventListener('abort', giveUp);
    }
  }

  const ownRenewal = renewal({
    access,
    locks,
    ask: async () => readReply(auth.renew, await send(auth.renew, {}, null)),
  });

  async function exchange(endpoint: Endpoint, given: LooseOptions) {
    const options =
      endpoint.method === 'GET' ? given : { ...given, idempotencyKey: given.idempotencyKey ?? newId() };
    if (endpoint.open) return send(endpoint, options, null);
    const token = access.token ?? (await ownRenewal.renewAfter(null));
    const first = await send(endpoint, options, token);
    if (first.response.status !== 401) return first;
    return send(endpoint, options, await ownRenewal.renewAfter(token));
  }

  return {
    renewal: ownRenewal,
    async call(endpoint, options) {
      return readReply(endpoint, await exchange(endpoint, options));
    },
    async downloadText(endpoint, options) {
      const { response, text } = await exchange(endpoint, options);
      if (!response.ok) throw readProblem(response.status, text, response.headers.get('retry-after'));
      const disposition = response.headers.get('content-disposition') ?? '';
      return { text, fileName: /filename="([^"\\/]+)"/.exec(disposition)?.[1] ?? null };
    },
  };
}

function readReply<E extends Endpoint>(
  endpoint: E,
  { response, text }: { response: Response; text: string },
): z.output<E['reply']> {
  if (!response.ok) throw readProblem(response.status, text, response.headers.get('retry-after'));
  const parsed = endpoint.reply.safeParse(endpoint.replyType === 'json' ? parseJson(text) : text);
  if (!parsed.success) throw notUnderstood(response.status);
  return parsed.data as z.output<E['reply']>;
}

export const api = createApi({
  access,
  fetch: (address, init) => fetch(address, init),
  locks: typeof navigator === 'undefined' ? undefined : navigator.locks,
});
export const { call, downloadText } = api;
