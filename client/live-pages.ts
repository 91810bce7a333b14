import { replaceEqualDeep, type InfiniteData, type QueryClient, type QueryKey } from '@tanstack/react-query';
import { outOfDate, type Applied, type Fact } from './facts';
import { takeRead, type OpenRead } from './live-cache';
import { liveMeta, tracked } from './live-query';

interface PageContext {
  client: QueryClient;
  signal: AbortSignal;
  pageParam: unknown;
}

interface LivePages<Page, Cursor> {
  projectId: string;
  queryKey: QueryKey;
  read: (before: Cursor | undefined, signal: AbortSignal) => Promise<Page>;
  /** Where the next page begins; null or undefined when there is none. */
  next: (page: Page) => Cursor | null | undefined;
  apply: (pages: Page[], fact: Fact) => Applied<Page[]>;
}

/** A list read page by page that follows the project's events; all its pages are one value in the cache. */
export function livePages<Page extends object, Cursor>({
  projectId,
  queryKey,
  read,
  next,
  apply,
}: LivePages<Page, Cursor>) {
  type Data = InfiniteData<Page, Cursor | undefined>;
  const meta = liveMeta<Data>(projectId, (data, fact) => {
    const pages = apply(data.pages, fact);
    if (pages === outOfDate) return outOfDate;
    return pages === data.pages ? data : { ...data, pages };
  });
  return {
    queryKey,
    meta,
    initialPageParam: undefined as Cursor | undefined,
    getNextPageParam: (page: Page) => next(page) ?? undefined,
    queryFn: ({ client, signal, pageParam }: PageContext): Promise<Page> =>
      tracked(client, projectId, () => read(pageParam as Cursor | undefined, signal)),
    structuralSharing: (held: unknown, fresh: unknown) => {
      // The read that began first saw everything that happened since.
      const under = ((fresh as Partial<Data>).pages ?? [])
        .map(takeRead)
        .reduce<OpenRead | null>((first, read) => earlier(first, read), null);
      return under ? replaceEqualDeep(held, under.land(queryKey, fresh as Data, meta.live)) : fresh;
    },
  };
}

function earlier(one: OpenRead | null, other: OpenRead | null): OpenRead | null {
  if (!one || !other) return one ?? other;
  return other.facts.length > one.facts.length ? other : one;
}
