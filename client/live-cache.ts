import { notifyManager, type Query, type QueryClient, type QueryKey } from '@tanstack/react-query';
import { outOfDate, type Fact } from './facts';
import type { LiveMeta } from './live-query';

/** Refetches that one burst of events asks for are gathered for so long. */
const gatherMilliseconds = 100;
/** A value that arrived is put into the cache within microtasks; one that was dropped is forgotten after this. */
const landingMilliseconds = 2000;

/** From here on events are counted: what was read before may lack some. Not so the read that brought the number. */
const counted = Symbol('counted from here');
type Word = Fact | typeof outOfDate | typeof counted;
interface Landed {
  projectId: string;
  word: Word;
}
type Live = LiveMeta['live'];

/** One read under way, with what happened since it began. */
export class OpenRead {
  readonly facts: Landed[] = [];

  constructor(
    readonly projectId: string | null,
    private readonly cache: LiveCache,
  ) {}

  arrived(value: object): void {
    reads.set(value, this);
    setTimeout(() => this.close(), landingMilliseconds);
  }

  close(): void {
    this.cache.endRead(this);
  }

  /** The value read, with everything applied that happened while it was under way. */
  land<Value>(queryKey: QueryKey, value: Value, live: Live): Value {
    this.close();
    const landed = applyAll(live, value, this.facts);
    if (landed !== outOfDate) return landed as Value;
    this.cache.readAgainAfterLanding(queryKey);
    return value;
  }
}

const reads = new WeakMap<object, OpenRead>();
/** The read that brought this value; null for a value that was patched. */
export function takeRead(value: unknown): OpenRead | null {
  if (typeof value !== 'object' || value === null) return null;
  const read = reads.get(value) ?? null;
  reads.delete(value);
  return read;
}

/** Takes facts into every cached value that follows them. */
export class LiveCache {
  private readonly open = new Set<OpenRead>();
  private readonly due = new Set<string>();
  private timer: ReturnType<typeof setTimeout> | null = null;

  constructor(private readonly client: QueryClient) {}

  beginRead(projectId: string | null): OpenRead {
    const read = new OpenRead(projectId, this);
    this.open.add(read);
    return read;
  }

  endRead(read: OpenRead): void {
    this.open.delete(read);
  }

  tell(projectId: string, words: readonly Word[]): void {
    const facts = words.map((word): Landed => ({ projectId, word }));
    for (const read of this.open) {
      if (read.projectId === null || read.projectId === projectId) read.facts.push(...facts);
    }
    notifyManager.batch(() => {
      for (const { query, live } of this.following(projectId)) this.take(query, live, facts);
    });
  }

  /** Forgets that anything held of the project is right. */
  readAfresh(projectId: string): void {
    this.tell(projectId, [outOfDate]);
  }

  /** The project's events are counted from now on. */
  countFromHere(projectId: string): void {
    this.tell(projectId, [counted]);
  }

  readAgainAfterLanding(queryKey: QueryKey): void {
    setTimeout(() => {
      const query = this.client.getQueryCache().find({ queryKey });
      if (query) this.markOutOfDate(query);
    }, 0);
  }

  private take(query: Query, live: Live, facts: readonly Landed[]): void {
    if (query.state.data === undefined) return;
    const value = applyAll(live, query.state.data, facts);
    if (value === outOfDate) return this.markOutOfDate(query);
    if (value === query.state.data) return;
    const { isInvalidated, dataUpdatedAt } = query.state;
    query.setData(value, { updatedAt: dataUpdatedAt, manual: true });
    // Writing calls a value fresh; one that waits to be read again still does.
    if (isInvalidated) query.invalidate();
  }

  private following(projectId: string) {
    return this.client
      .getQueryCache()
      .getAll()
      .flatMap((query) => {
        const live = (query.meta as LiveMeta | undefined)?.live;
        return live && (live.projectId === null || live.projectId === projectId) ? [{ query, live }] : [];
      });
  }

  private markOutOfDate(query: Query): void {
    query.invalidate();
    this.due.add(query.queryHash);
    this.timer ??= setTimeout(() => {
      this.timer = null;
      const due = new Set(this.due);
      this.due.clear();
      // One that is under way lands first: what it missed makes it due again. So a busy project can't starve it.
      const filters = { type: 'active', predicate: (one: Query) => due.has(one.queryHash) } as const;
      void this.client.refetchQueries(filters, { cancelRefetch: false });
    }, gatherMilliseconds);
  }
}

function applyAll(live: Live, value: unknown, facts: readonly Landed[]): unknown {
  let now = value;
  try {
    for (const { word, projectId } of facts) {
      if (word === counted && live.anchors) continue;
      if (word === counted || word === outOfDate) return outOfDate;
      now = live.apply(now, word, projectId);
      if (now === outOfDate) return outOfDate;
    }
    return now;
  } catch (error) {
    console.error(error);
    return outOfDate;
  }
}

const caches = new WeakMap<QueryClient, LiveCache>();
export function liveCacheOf(client: QueryClient): LiveCache {
  const known = caches.get(client) ?? new LiveCache(client);
  caches.set(client, known);
  return known;
}
