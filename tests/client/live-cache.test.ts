import { InfiniteQueryObserver, QueryObserver, type QueryClient } from '@tanstack/react-query';
import fc from 'fast-check';
import { outOfDate, type Apply, type Fact } from '@/client/facts';
import { byText, putNewer } from '@/client/keep-newer';
import { liveCacheOf } from '@/client/live-cache';
import { livePages } from '@/client/live-pages';
import { liveQuery } from '@/client/live-query';
import { makeQueryClient } from '@/client/query-client';
import type { Upload } from '@/shared/contracts/uploads';
import { idOf, upload } from './support/contract-values';

const projectId = idOf(7);
const key = ['project', projectId, 'uploads'];
const settle = async () => {
  for (let turn = 0; turn < 30; turn += 1) await Promise.resolve();
};
const changed = (payload: Upload): Fact => ({ kind: 'upload.changed', payload });
const inOrder = (one: Upload, other: Upload) => byText(one.id, other.id);
const apply = (list: Upload[], fact: Fact) =>
  fact.kind === 'upload.changed' ? putNewer(list, fact.payload, inOrder) : list;

/** A server whose answers are fixed when asked and land when told to. */
class SlowServer {
  state: Upload[] = [];
  asked = 0;
  private underWay: (() => void)[] = [];

  read = (): Promise<Upload[]> => {
    this.asked += 1;
    const answer = structuredClone(this.state);
    return new Promise((resolve) => this.underWay.push(() => resolve(answer)));
  };

  change(id: string): Fact {
    const old = this.state.find((one) => one.id === id);
    const next = upload({ id, version: (old?.version ?? 0) + 1, done: (old?.done ?? 0) + 1 });
    this.state = putNewer(this.state, next, inOrder);
    return changed(next);
  }

  async land(): Promise<void> {
    this.underWay.shift()?.();
    await settle();
  }

  get isSlow(): boolean {
    return this.underWay.length > 0;
  }
}

let clients: QueryClient[] = [];
function open(read: () => Promise<Upload[]>, applyFact: Apply<Upload[]> = apply) {
  const client = makeQueryClient();
  clients.push(client);
  const options = liveQuery<Upload[]>({ projectId, queryKey: key, read, apply: applyFact });
  const stop = new QueryObserver(client, options).subscribe(() => {});
  return { client, cache: liveCacheOf(client), stop, held: () => client.getQueryData<Upload[]>(key) };
}

beforeEach(() => jest.useFakeTimers());
afterEach(() => {
  for (const client of clients) client.clear();
  clients = [];
  jest.clearAllTimers();
  jest.useRealTimers();
});

type Step = 'change' | 'tell' | 'refetch' | 'land';
const steps = fc.array(
  fc.record({
    act: fc.constantFrom<Step>('change', 'change', 'tell', 'tell', 'refetch', 'land'),
    at: fc.nat(3),
  }),
  { maxLength: 40 },
);

test('events and answers that cross each other leave what the server has', async () => {
  await fc.assert(
    fc.asyncProperty(steps, async (plays) => {
      const server = new SlowServer();
      const page = open(server.read);
      const untold: Fact[] = [];
      await settle();
      for (const { act, at } of plays) {
        if (act === 'change') untold.push(server.change(idOf(at)));
        if (act === 'tell') page.cache.tell(projectId, untold.splice(0, 1));
        // As focus and reconnect do; what is under way is dropped and asked for anew.
        if (act === 'refetch') void page.client.refetchQueries({ queryKey: key });
        if (act === 'land') await server.land();
        await settle();
      }
      page.cache.tell(projectId, untold);
      while (server.isSlow) await server.land();
      expect(page.held()).toEqual(server.state);
      page.stop();
    }),
    { numRuns: 200 },
  );
});

test('an answer older than an event does not take it back', async () => {
  const server = new SlowServer();
  const page = open(server.read);
  await settle();
  const fact = server.change(idOf(1)); // after the question, before the answer
  page.cache.tell(projectId, [fact]);
  await server.land();
  expect(page.held()).toEqual([fact.payload]);
  page.stop();
});

test('what cannot be patched is read again, once for a burst, and never starved', async () => {
  const server = new SlowServer();
  const page = open(server.read, () => outOfDate);
  await settle();
  await server.land();
  expect(server.asked).toBe(1);
  for (let burst = 0; burst < 50; burst += 1) {
    page.cache.tell(projectId, [server.change(idOf(burst % 3))]);
    await jest.advanceTimersByTimeAsync(10);
  }
  // Five tenths of a second of events: the answer under way was never thrown away for a newer question.
  expect(server.asked).toBe(2);
  await server.land();
  await jest.advanceTimersByTimeAsync(150);
  expect(server.asked).toBe(3);
  await server.land();
  await jest.advanceTimersByTimeAsync(150);
  expect(server.asked).toBe(3);
  expect(page.held()).toEqual(server.state);
  page.stop();
});

test('a patch does not call a value fresh that still has to be read again', async () => {
  const server = new SlowServer();
  const page = open(server.read);
  await settle();
  await server.land();
  page.stop();
  page.cache.readAfresh(projectId);
  page.cache.tell(projectId, [server.change(idOf(1))]);
  expect(page.client.getQueryState(key)?.isInvalidated).toBe(true);
  expect(page.held()).toHaveLength(1);
});

test('facts of one project leave another alone', async () => {
  const server = new SlowServer();
  const page = open(server.read);
  await settle();
  await server.land();
  page.cache.tell(idOf(8), [server.change(idOf(1))]);
  expect(page.held()).toEqual([]);
  page.stop();
});

test('what was read before events are counted is read again, but not the read that brought the number', async () => {
  const client = makeQueryClient();
  clients.push(client);
  const reads: string[] = [];
  const observe = (name: string, anchors: boolean, read: () => Promise<Upload[]>) =>
    new QueryObserver(
      client,
      liveQuery<Upload[]>({ projectId, queryKey: ['project', projectId, name], read, apply, anchors }),
    ).subscribe(() => {});
  const stops = [
    observe('before', false, async () => (reads.push('before'), [])),
    observe('anchor', true, async () => {
      reads.push('anchor');
      if (reads.filter((one) => one === 'anchor').length === 1) {
        await settle();
        liveCacheOf(client).countFromHere(projectId);
      }
      return [];
    }),
  ];
  await jest.advanceTimersByTimeAsync(1000);
  expect(reads).toEqual(['before', 'anchor', 'before']);
  for (const stop of stops) stop();
});

test('a list of pages is one value: an event that lands while the next page comes is kept', async () => {
  const client = makeQueryClient();
  clients.push(client);
  let land: (() => void) | undefined;
  const pages = [[upload({ id: idOf(1) })], [upload({ id: idOf(2) })]];
  const options = livePages<Upload[], number>({
    projectId,
    queryKey: key,
    read: (before = 0) =>
      new Promise((resolve) => (land = () => resolve(structuredClone(pages[before] ?? [])))),
    next: (page) => (page[0]?.id === idOf(1) ? 1 : null),
    apply: (held, fact) =>
      held.map((page) =>
        page.map((one) =>
          fact.kind === 'upload.changed' && fact.payload.id === one.id && fact.payload.version > one.version
            ? fact.payload
            : one,
        ),
      ),
  });
  const observer = new InfiniteQueryObserver(client, options);
  const stop = observer.subscribe(() => {});
  await settle();
  land?.();
  await settle();
  const more = observer.fetchNextPage();
  await settle();
  liveCacheOf(client).tell(projectId, [
    changed(upload({ id: idOf(1), version: 2 })),
    changed(upload({ id: idOf(2), version: 5 })),
  ]);
  land?.();
  await more;
  const held = client.getQueryData<{ pages: Upload[][] }>(key);
  expect(held?.pages.map((page) => page.map(({ version }) => version))).toEqual([[2], [5]]);
  stop();
});
