import {
  replaceEqualDeep,
  type QueryClient,
  type QueryFunctionContext,
  type QueryKey,
} from '@tanstack/react-query';
import type { Apply, Fact } from './facts';
import { liveCacheOf, takeRead } from './live-cache';

/** How a cached value follows the events of its project; kept beside the query. */
export interface LiveMeta extends Record<string, unknown> {
  live: {
    /** Null for what spans projects. */
    projectId: string | null;
    apply: (value: unknown, fact: Fact, projectId: string) => unknown;
    /** The read from which the project's event number is taken. */
    anchors?: boolean;
  };
}

interface LiveRead<Value> {
  projectId: string | null;
  queryKey: QueryKey;
  read: (signal: AbortSignal) => Promise<Value>;
  apply: Apply<Value>;
  /** Joins what was read with what is held, where a read brings only a part. */
  merge?: (held: Value, fresh: Value) => Value;
  anchors?: boolean;
}

/**
 * A query whose value follows the project's events. An event patches it where it can, else it is read again. An
 * answer that was under way while events landed has them applied before it replaces what is held.
 */
export function liveQuery<Value extends object>({ read, apply, merge, ...rest }: LiveRead<Value>) {
  const { projectId, queryKey, anchors } = rest;
  const meta = liveMeta(projectId, apply, anchors);
  return {
    queryKey,
    meta,
    queryFn: ({ client, signal }: QueryFunctionContext): Promise<Value> =>
      tracked(client, projectId, () => read(signal)),
    structuralSharing: (held: unknown, fresh: unknown) => {
      const under = takeRead(fresh);
      if (!under) return fresh;
      const joined = merge && held !== undefined ? merge(held as Value, fresh as Value) : (fresh as Value);
      return replaceEqualDeep(held, under.land(queryKey, joined, meta.live));
    },
  };
}

export function liveMeta<Value>(projectId: string | null, apply: Apply<Value>, anchors = false): LiveMeta {
  return { live: { projectId, anchors, apply: (value, fact, of) => apply(value as Value, fact, of) } };
}

/** Reads, and remembers the facts that land meanwhile. */
export async function tracked<Value extends object>(
  client: QueryClient,
  projectId: string | null,
  read: () => Promise<Value>,
): Promise<Value> {
  const open = liveCacheOf(client).beginRead(projectId);
  try {
    const value = await read();
    open.arrived(value);
    return value;
  } catch (error) {
    open.close();
    throw error;
  }
}
