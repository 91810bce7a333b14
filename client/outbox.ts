import { threads, type Subject } from '@/shared/contracts/threads';
import { call, type Api } from './api';
import { drafts } from './drafts';
import { Emitter } from './emitter';
import { liveProjects, type LiveProjects } from './live-projects';
import { newId } from './new-id';
import { asApiProblem } from './problem';
import {
  composerPlace,
  hasAged,
  inSendingOrder,
  laneOf,
  queuedMessage,
  type QueuedMessage,
} from './queued-message';
import { storage, type Storage } from './storage';
import { backoffMilliseconds, Pause } from './wait';

export interface OutboxTools {
  storage: Storage;
  /** Sends one and takes in the reply. Throws `ApiProblem`. */
  send: (message: QueuedMessage) => Promise<void>;
  /** Keeps a message that nobody took for a day as a draft. */
  giveBack: (account: string, message: QueuedMessage) => Promise<void>;
  now?: () => number;
  pauseMilliseconds?: (attempt: number) => number;
  locks?: LockManager;
}

export interface NewMessage {
  projectId: string;
  subject: Subject;
  text: string;
  /** The key it had before, when it was given back as a draft and is sent unchanged. */
  clientKey?: string;
}

const waits = { firstMilliseconds: 500, mostMilliseconds: 8000 };
const none: QueuedMessage[] = [];

/**
 * Messages on their way. One is stored before it is shown, sent in the order of its thread, tried again under the same
 * key until the server took or refused it, and gone only then.
 */
export class Outbox {
  private account: string | null = null;
  private lanes = new Map<string, QueuedMessage[]>();
  private adding: Promise<unknown> = Promise.resolve();
  private lastQueuedAt = 0;
  private readonly running = new Map<string, Pause>();
  private readonly changes = new Emitter<[]>();
  readonly subscribe = this.changes.subscribe;

  constructor(private readonly tools: OutboxTools) {}

  /** Takes up what this account left unsent, in this tab or another. */
  async open(account: string): Promise<void> {
    if (this.account !== account) this.close();
    this.account = account;
    await this.load(account);
    this.wake();
  }

  close(): void {
    this.account = null;
    this.lanes = new Map();
    this.endWaits();
    this.running.clear();
    this.changes.emit();
  }

  messagesOf(lane: string): QueuedMessage[] {
    return this.lanes.get(lane) ?? none;
  }

  /** Resolves when it is stored; then it is shown, and the text may leave the composer. */
  add({ projectId, subject, text, clientKey = newId() }: NewMessage): Promise<QueuedMessage> {
    const account = this.account;
    if (account === null) return Promise.reject(new Error('Nobody is signed in.'));
    const queuedAt = (this.lastQueuedAt = Math.max(this.lastQueuedAt, this.now()));
    const message = { clientKey, projectId, subject, text, queuedAt, refusal: null };
    // One after the other, so that the first written is the first sent.
    const added = this.adding.then(async () => {
      await this.tools.storage.set(keyOf(account, clientKey), message);
      if (this.account === account) {
        this.put(message);
        void this.run(laneOf(message));
      }
      return message;
    });
    this.adding = added.catch(() => {});
    return added;
  }

  /** The server has it, whoever says so: the reply, an event or a read. */
  async acknowledge(clientKey: string): Promise<void> {
    await this.drop(clientKey);
  }

  /** Takes a message back before it is sent, or after it was refused. */
  async takeBack(clientKey: string): Promise<QueuedMessage | null> {
    return this.drop(clientKey);
  }

  /** Sends a refused one again, because the reason may be gone. */
  async tryAgain(clientKey: string): Promise<void> {
    const message = this.find(clientKey);
    if (message) await this.store({ ...message, refusal: null });
    if (message) void this.run(laneOf(message));
  }

  /** The line is back: nothing waits for the clock. */
  wake(): void {
    this.endWaits();
    for (const lane of this.lanes.keys()) void this.run(lane);
  }

  private endWaits(): void {
    for (const pause of this.running.values()) pause.wake();
  }

  private async load(account: string): Promise<void> {
    const keys = await this.tools.storage.keysFrom(keyOf(account, ''));
    const stored = await Promise.all(keys.map((key) => this.tools.storage.get(key)));
    if (this.account !== account) return;
    for (const value of stored) {
      const message = queuedMessage.safeParse(value);
      if (message.success && !this.find(message.data.clientKey)) this.put(message.data);
    }
  }

  private async run(lane: string): Promise<void> {
    const account = this.account;
    if (account === null || this.running.has(lane)) return;
    const pause = new Pause();
    this.running.set(lane, pause);
    const isOpen = () => this.account === account && this.running.get(lane) === pause;
    try {
      for (let failures = 0; isOpen();) {
        const message = this.messagesOf(lane).find((one) => one.refusal === null);
        if (!message) return;
        const again = await this.alone(account, () => this.sendOne(account, message));
        failures = again === null ? 0 : failures + 1;
        if (again !== null && isOpen()) await pause.wait(Math.max(again, this.pauseFor(failures - 1)));
      }
    } finally {
      if (this.running.get(lane) === pause) this.running.delete(lane);
    }
  }

  /** Null when it is settled one way or another, else for how long the server wants to be left alone. */
  private async sendOne(account: string, message: QueuedMessage): Promise<number | null> {
    try {
      if (!(await this.tools.storage.get(keyOf(account, message.clientKey)))) {
        this.forget(message.clientKey); // another tab settled it
        return null;
      }
      if (hasAged(message, this.now())) {
        await this.tools.giveBack(account, message);
      } else {
        await this.tools.send(message);
        this.endWaits(); // taken: so the others may try as well
      }
      await this.drop(message.clientKey, account);
      return null;
    } catch (error) {
      const problem = asApiProblem(error);
      if (problem.undecided || problem.status === 401) return 1000 * (problem.retryAfterSeconds ?? 0);
      if (this.account === account) await this.store({ ...message, refusal: problem.message });
      return null;
    }
  }

  /** One tab sends at a time, where the browser can tell; elsewhere the key makes twice into once. */
  private async alone<Value>(account: string, work: () => Promise<Value>): Promise<Value> {
    return this.tools.locks ? this.tools.locks.request(`locant-outbox-${account}`, work) : work();
  }

  private pauseFor(attempt: number): number {
    return this.tools.pauseMilliseconds?.(attempt) ?? backoffMilliseconds(attempt, waits);
  }

  private now(): number {
    return (this.tools.now ?? Date.now)();
  }

  private find(clientKey: string): QueuedMessage | null {
    for (const messages of this.lanes.values()) {
      const found = messages.find((one) => one.clientKey === clientKey);
      if (found) return found;
    }
    return null;
  }

  private async store(message: QueuedMessage): Promise<void> {
    if (!this.account || !this.find(message.clientKey)) return;
    await this.tools.storage.set(keyOf(this.account, message.clientKey), message);
    this.put(message);
  }

  private put(message: QueuedMessage): void {
    const lane = laneOf(message);
    const others = this.messagesOf(lane).filter((one) => one.clientKey !== message.clientKey);
    this.lanes.set(lane, [...others, message].sort(inSendingOrder));
    this.changes.emit();
  }

  private async drop(clientKey: string, account = this.account): Promise<QueuedMessage | null> {
    const message = this.find(clientKey);
    if (account && (message || account !== this.account))
      await this.tools.storage.remove(keyOf(account, clientKey));
    this.forget(clientKey);
    return message;
  }

  private forget(clientKey: string): void {
    const message = this.find(clientKey);
    if (!message) return;
    const lane = laneOf(message);
    const rest = this.messagesOf(lane).filter((one) => one !== message);
    if (rest.length > 0) this.lanes.set(lane, rest);
    else this.lanes.delete(lane);
    this.changes.emit();
  }
}

function keyOf(account: string, clientKey: string): string {
  return `outbox/${account}/${clientKey}`;
}

/** Sends over HTTP; what the reply says is taken in as the event will be. */
export function sendOver(call: Api['call'], live: Pick<LiveProjects, 'tell'>): OutboxTools['send'] {
  return async ({ projectId, clientKey, subject, text }) => {
    const body = { clientKey, subject, text };
    const posted = await call(threads.post, { params: { projectId }, body, idempotencyKey: clientKey });
    live.tell(projectId, [{ kind: 'message.posted', payload: posted }]);
  };
}

export const outbox = new Outbox({
  storage,
  send: sendOver(call, liveProjects),
  giveBack: (account, message) => drafts.giveBack(account, composerPlace(message), message),
  locks: typeof navigator === 'undefined' ? undefined : navigator.locks,
});
