import { AsyncLocalStorage } from 'node:async_hooks';

/** Who asks, under which request, and the key under which the client knows its own request again. */
export interface RequestContext {
  requestId: string;
  actorId: string | null;
  clientRequest: { key: string; hash: string } | null;
}

const storage = new AsyncLocalStorage<RequestContext>();

export const withRequestContext = <T>(context: RequestContext, work: () => T): T =>
  storage.run(context, work);
export const requestContext = (): RequestContext | null => storage.getStore() ?? null;
