import { QueryClient } from '@tanstack/react-query';
import { ApiProblem } from './problem';
import type { LiveMeta } from './live-query';
import { backoffMilliseconds } from './wait';

declare module '@tanstack/react-query' {
  interface Register {
    defaultError: ApiProblem;
    queryMeta: Partial<LiveMeta>;
  }
}

const mostRetries = 3;
const minute = 60_000;

/** Reads are tried again while nobody knows the answer; a refusal is an answer. Writes are never sent by themselves. */
export function makeQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        // Events keep what is held right; this is for what was held while no line was up.
        staleTime: 30_000,
        gcTime: 30 * minute,
        // The browser's own idea of being online is often wrong: ask, and say plainly when nothing answers.
        networkMode: 'always',
        refetchOnReconnect: true,
        retry: (failures, error) => failures < mostRetries && error instanceof ApiProblem && error.undecided,
        retryDelay: (failures, error) =>
          1000 * (error.retryAfterSeconds ?? 0) +
          backoffMilliseconds(failures, { firstMilliseconds: 500, mostMilliseconds: 8000 }),
      },
      mutations: { networkMode: 'always', retry: false },
    },
  });
}

export const queryClient = makeQueryClient();

/** Somebody else sits here now: nothing of what was read stays. */
export function forgetEverything(client: QueryClient): void {
  void client.cancelQueries();
  client.getMutationCache().clear();
  client.removeQueries({ type: 'inactive' });
  void client.resetQueries();
}
