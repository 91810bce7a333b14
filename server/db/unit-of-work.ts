import { AsyncLocalStorage } from 'node:async_hooks';
import type { DataSource, EntityManager } from 'typeorm';
import { busy, conflict } from '../lib/problem';
import { ClientRequest } from './entities';
import { requestContext } from '../lib/request-context';
import { isConnectionLost, isDuplicate, isRetryable } from '../lib/database-errors';
import { ProjectTurns } from './project-turns';
import { Unit, type AnnouncedEvent } from './unit';

const attempts = 6;
/** Everything of one request fits in well under this; a unit that waits longer gives its connection back. */
const wait = (attempt: number) =>
  new Promise((done) => setTimeout(done, 5 + Math.random() * 20 * 2 ** attempt));

export interface WriteScope {
  /** The project whose events this unit may announce; null for what belongs to no project. */
  projectId: string | null;
  /** Who acts, when it is not the person who asks (a job acts for the person who started it). */
  actorId?: string;
}

export type Publish = (events: readonly AnnouncedEvent[]) => void;

/**
 * The only place where a transaction begins. One unit writes rows, audit, events, jobs and the reply kept for the
 * client's key, commits, and only then publishes. Deadlocks, lock waits and snapshot errors run the whole unit again.
 */
export class UnitOfWork {
  private publish: Publish = () => {};
  private readonly turns = new ProjectTurns();
  private readonly inside = new AsyncLocalStorage<EntityManager>();

  constructor(private readonly source: DataSource) {}

  onCommitted(publish: Publish): void {
    this.publish = publish;
  }

  /**
   * For reading. Inside a unit it is the unit's own connection: a second one taken there would make units wait for
   * each other for ever as soon as they hold the whole pool, and would not see what the unit has written.
   */
  get reader(): EntityManager {
    return this.inside.getStore() ?? this.source.manager;
  }

  /** `work` returns what is answered; asked again under the same client key, the same is answered without working. */
  async write<T>(scope: WriteScope, work: (unit: Unit) => Promise<T>): Promise<T> {
    // It would wait for its own project's turn, for ever.
    if (this.inside.getStore()) throw new Error('A unit of work cannot begin inside another.');
    for (let attempt = 0; ; attempt += 1) {
      let isCommitting = false;
      const once = () =>
        this.once(scope, work, () => {
          isCommitting = true;
        });
      try {
        return await this.turns.take(scope.projectId, async () => {
          const { reply, events } = await once();
          // Still in its turn, so that events go out in the order of their numbers.
          if (events.length > 0) this.publish(events);
          return reply;
        });
      } catch (error) {
        const hasKey = Boolean(requestContext()?.clientRequest);
        // A clash on the client's key means that the same request was just answered elsewhere: the retry finds it.
        const clashed = isDuplicate(error) && hasKey && attempt === 0;
        // Lost while committing, nobody knows whether it is written: only a client's key makes trying again safe.
        const isSafelyLost = isConnectionLost(error) && (hasKey || !isCommitting);
        const again = isRetryable(error) || clashed || isSafelyLost;
        if (again && attempt + 1 < attempts) {
          await wait(attempt);
          continue;
        }
        if (isConnectionLost(error))
          throw busy('The database does not answer. Your work is kept; try again in a moment.');
        if (isRetryable(error)) throw busy('Too many people write here at once. Try again in a moment.');
        throw error;
      }
    }
  }

  private async once<T>(scope: WriteScope, work: (unit: Unit) => Promise<T>, onCommitting: () => void) {
    const context = requestContext();
    const actorId = scope.actorId ?? context?.actorId;
    if (!actorId) throw new Error('A unit of work needs somebody who acts.');
    return this.source.transaction('READ COMMITTED', async (manager) => {
      const unit = new Unit(manager, {
        actorId,
        requestId: context?.requestId ?? 'job',
        projectId: scope.projectId,
      });
      await unit.lockStream();
      const clientRequest = context?.clientRequest;
      if (clientRequest) {
        const known = await manager.findOneBy(ClientRequest, {
          personId: actorId,
          clientKey: clientRequest.key,
        });
        if (known && known.requestHash !== clientRequest.hash) {
          throw conflict(
            'key-reused',
            'This request key was used before for something else. Send it under a new key.',
          );
        }
        if (known) return { reply: known.reply as T, events: [] };
      }
      const reply = await this.inside.run(manager, () => work(unit));
      await unit.seal();
      if (clientRequest) {
        await manager.insert(ClientRequest, {
          personId: actorId,
          clientKey: clientRequest.key,
          requestHash: clientRequest.hash,
          reply: reply as object,
          at: unit.at,
        });
      }
      onCommitting();
      return { reply, events: unit.events };
    });
  }
}
