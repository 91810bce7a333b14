import fc from 'fast-check';
import { Outbox } from '@/client/outbox';
import { offline, readProblem } from '@/client/problem';
import { laneOf, type QueuedMessage } from '@/client/queued-message';
import { memoryStorage, type Storage } from '@/client/storage';

const projectId = '01900000-0000-7000-8000-000000000001';
const proteinId = '01900000-0000-7000-8000-000000000002';
const subjectAt = (residueIndex: number) => ({ kind: 'residue' as const, proteinId, residueIndex });
const lane = (residueIndex = 0) => laneOf({ projectId, subject: subjectAt(residueIndex) });
const busy = () => readProblem(503, '', null);
const forbidden = () =>
  readProblem(
    403,
    JSON.stringify({
      type: '/problems/not-allowed',
      title: 'Not allowed',
      status: 403,
      code: 'not-allowed',
      detail: 'Readers do not write here.',
      requestId: 'r',
    }),
    null,
  );
const until = async (holds: () => boolean) => {
  for (let turn = 0; turn < 400 && !holds(); turn += 1) await new Promise((done) => setTimeout(done, 1));
  expect(holds()).toBe(true);
};

/** Takes messages as the server does: by key, once. `line` says what becomes of each try. */
class FakeServer {
  readonly stored: string[] = [];
  readonly keys = new Set<string>();
  tries = 0;
  line: (text: string, attempt: number) => 'ok' | 'lost before' | 'lost after' | 'busy' | 'refused' = () =>
    'ok';
  private readonly attempts = new Map<string, number>();

  readonly send = async ({ clientKey, text }: QueuedMessage): Promise<void> => {
    this.tries += 1;
    const attempt = this.attempts.get(clientKey) ?? 0;
    this.attempts.set(clientKey, attempt + 1);
    await Promise.resolve();
    const fate = this.line(text, attempt);
    if (fate === 'lost before') throw offline();
    if (fate === 'busy') throw busy();
    if (fate === 'refused') throw forbidden();
    if (!this.keys.has(clientKey)) this.stored.push(text);
    this.keys.add(clientKey);
    if (fate === 'lost after') throw offline();
  };
}

interface Given {
  server?: FakeServer;
  storage?: Storage;
  now?: () => number;
  giveBack?: (account: string, message: QueuedMessage) => Promise<void>;
}

function outboxWith({ server = new FakeServer(), storage = memoryStorage(), now, giveBack }: Given = {}) {
  const outbox = new Outbox({
    storage,
    send: server.send,
    giveBack: giveBack ?? (() => Promise.reject(new Error('not expected'))),
    pauseMilliseconds: () => 1,
    now,
  });
  return { outbox, server, storage };
}

const textsOf = (outbox: Outbox, at = 0) => outbox.messagesOf(lane(at)).map(({ text }) => text);

describe('the outbox', () => {
  test('brings every message to the server once and in order, whatever the line does', async () => {
    const fate = fc.constantFrom('ok', 'lost before', 'lost after', 'busy') as fc.Arbitrary<'ok' | 'busy'>;
    await fc.assert(
      fc.asyncProperty(
        fc.array(fc.array(fate, { maxLength: 4 }), { minLength: 1, maxLength: 6 }),
        async (fates) => {
          const { outbox, server } = outboxWith();
          server.line = (text, attempt) => fates[Number(text)]?.[attempt] ?? 'ok';
          await outbox.open('ines');
          await Promise.all(
            fates.map((_, at) => outbox.add({ projectId, subject: subjectAt(0), text: String(at) })),
          );
          await until(() => textsOf(outbox).length === 0);
          expect(server.stored).toEqual(fates.map((_, at) => String(at)));
          outbox.close();
        },
      ),
      { numRuns: 40 },
    );
  });

  test('stores a message before it shows it', async () => {
    const storage = memoryStorage();
    const { outbox } = outboxWith({ storage });
    const order: string[] = [];
    const set = storage.set;
    storage.set = async (key, value) => {
      await set(key, value);
      order.push('stored');
    };
    outbox.subscribe(() => order.push('shown'));
    await outbox.open('ines');
    order.length = 0;
    await outbox.add({ projectId, subject: subjectAt(0), text: 'H+ path' });
    expect(order.slice(0, 2)).toEqual(['stored', 'shown']);
    outbox.close();
  });

  test('a message that waits holds up its own thread only', async () => {
    const { outbox, server } = outboxWith();
    server.line = (text) => (text === 'stuck' ? 'busy' : 'ok');
    await outbox.open('ines');
    await outbox.add({ projectId, subject: subjectAt(0), text: 'stuck' });
    await outbox.add({ projectId, subject: subjectAt(0), text: 'behind it' });
    await outbox.add({ projectId, subject: subjectAt(1), text: 'elsewhere' });
    await until(() => server.stored.includes('elsewhere'));
    expect(server.stored).toEqual(['elsewhere']);
    expect(textsOf(outbox)).toEqual(['stuck', 'behind it']);
    outbox.close();
  });

  test('a refused message stays with its reason, lets the next one pass and can be tried again', async () => {
    const { outbox, server } = outboxWith();
    let refuses = true;
    server.line = (text) => (text === 'first' && refuses ? 'refused' : 'ok');
    await outbox.open('ines');
    const { clientKey } = await outbox.add({ projectId, subject: subjectAt(0), text: 'first' });
    await outbox.add({ projectId, subject: subjectAt(0), text: 'second' });
    await until(() => server.stored.includes('second'));
    expect(outbox.messagesOf(lane())).toMatchObject([
      { text: 'first', refusal: 'Readers do not write here.' },
    ]);
    refuses = false;
    await outbox.tryAgain(clientKey);
    await until(() => server.stored.includes('first'));
    await until(() => textsOf(outbox).length === 0);
    outbox.close();
  });

  test('what was left is taken up again by the same account, and by no other', async () => {
    const storage = memoryStorage();
    const { outbox, server } = outboxWith({ storage });
    server.line = () => 'lost before';
    await outbox.open('ines');
    await outbox.add({ projectId, subject: subjectAt(0), text: 'for later' });
    outbox.close();
    const later = outboxWith({ storage });
    await later.outbox.open('omar');
    expect(textsOf(later.outbox)).toEqual([]);
    await later.outbox.open('ines');
    await until(() => later.server.stored.length === 1);
    expect(later.server.stored).toEqual(['for later']);
    await until(() => textsOf(later.outbox).length === 0);
    expect(await storage.keysFrom('outbox/')).toEqual([]);
    later.outbox.close();
  });

  test('an event that shows the message settles it, and it is not sent again', async () => {
    const { outbox, server, storage } = outboxWith();
    server.line = () => 'lost after';
    await outbox.open('ines');
    const { clientKey } = await outbox.add({ projectId, subject: subjectAt(0), text: 'once' });
    await until(() => server.tries > 0);
    await outbox.acknowledge(clientKey);
    expect(textsOf(outbox)).toEqual([]);
    expect(await storage.keysFrom('outbox/')).toEqual([]);
    const tries = server.tries;
    await new Promise((done) => setTimeout(done, 20));
    expect(server.tries).toBeLessThanOrEqual(tries + 1); // one may have been under way
    expect(server.stored).toEqual(['once']);
    outbox.close();
  });

  test('a message another tab settled is not sent by this one', async () => {
    const storage = memoryStorage();
    const { outbox, server } = outboxWith({ storage });
    server.line = () => 'busy';
    await outbox.open('ines');
    const { clientKey } = await outbox.add({ projectId, subject: subjectAt(0), text: 'done elsewhere' });
    await storage.remove(`outbox/ines/${clientKey}`);
    server.line = () => 'ok';
    await until(() => textsOf(outbox).length === 0);
    expect(server.stored).toEqual([]);
    outbox.close();
  });

  test('after a day it is a draft again and not sent', async () => {
    const storage = memoryStorage();
    let now = 1_000_000;
    const back: string[] = [];
    const giveBack = async (_account: string, message: QueuedMessage) => void back.push(message.text);
    const { outbox, server } = outboxWith({ storage, now: () => now, giveBack });
    server.line = () => 'lost before';
    await outbox.open('ines');
    await outbox.add({ projectId, subject: subjectAt(0), text: 'yesterday' });
    await until(() => server.tries > 0);
    now += 24 * 60 * 60_000 + 1;
    await until(() => textsOf(outbox).length === 0);
    expect(back).toEqual(['yesterday']);
    expect(server.stored).toEqual([]);
    expect(await storage.keysFrom('outbox/')).toEqual([]);
    outbox.close();
  });
});
