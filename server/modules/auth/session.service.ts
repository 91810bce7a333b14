import { randomBytes } from 'node:crypto';
import { IsNull } from 'typeorm';
import type { EntityManager } from 'typeorm';
import type { UnitOfWork } from '../../db';
import { sha256 } from '../../lib/hash';
import { newId } from '../../lib/new-id';
import { Session } from './session.entity';

const daysKept = 30;
/** Two tabs may renew with the same token at once; the slower one gets the family's newest session. */
const graceMilliseconds = 10_000;

export interface OpenSession {
  personId: string;
  familyId: string;
  /** What the cookie carries; only its hash is stored. */
  token: string;
  expiresAt: Date;
}

export type Renewal =
  | { session: OpenSession }
  | { refused: 'unknown' }
  /** A used token came back: everything that came from the same sign-in ended. */
  | { refused: 'reused'; endedFamilyId: string };

/** Renewing tokens: each use makes a successor; a used one that comes back after the grace ends the whole family. */
export class SessionService {
  constructor(private readonly unitOfWork: UnitOfWork) {}

  async open(personId: string): Promise<OpenSession> {
    return this.unitOfWork.write({ projectId: null, actorId: personId }, (unit) =>
      this.insert(unit.manager, personId, newId(), unit.at),
    );
  }

  async renew(token: string): Promise<Renewal> {
    const known = await this.unitOfWork.reader.findOneBy(Session, { tokenHash: sha256(token) });
    if (!known) return { refused: 'unknown' };
    return this.unitOfWork.write<Renewal>({ projectId: null, actorId: known.personId }, async (unit) => {
      const { manager, at } = unit;
      const row = await manager.findOne(Session, {
        where: { id: known.id },
        lock: { mode: 'pessimistic_write' },
      });
      if (!row || row.revokedAt || row.expiresAt <= at) return { refused: 'unknown' };
      if (row.replacedAt) {
        if (at.getTime() - row.replacedAt.getTime() > graceMilliseconds) {
          await manager.update(Session, { familyId: row.familyId, revokedAt: IsNull() }, { revokedAt: at });
          await unit.audit({ action: 'session.reused', subjectKind: 'person', subjectId: row.personId });
          return { refused: 'reused', endedFamilyId: row.familyId };
        }
        // The loser of a race gets a sibling of the successor: both tabs go on, neither clears the other's cookie.
        return { session: await this.insert(manager, row.personId, row.familyId, at) };
      }
      const session = await this.insert(manager, row.personId, row.familyId, at);
      const successor = await manager.findOneByOrFail(Session, { tokenHash: sha256(session.token) });
      await manager.update(Session, { id: row.id }, { replacedBy: successor.id, replacedAt: at });
      return { session };
    });
  }

  /** Ends the family the token belongs to; returns it so that its sockets can be cut. */
  async close(token: string): Promise<string | null> {
    const row = await this.unitOfWork.reader.findOneBy(Session, { tokenHash: sha256(token) });
    if (!row) return null;
    await this.unitOfWork.write({ projectId: null, actorId: row.personId }, (unit) =>
      unit.manager.update(Session, { familyId: row.familyId, revokedAt: IsNull() }, { revokedAt: unit.at }),
    );
    return row.familyId;
  }

  async isOpen(familyId: string): Promise<boolean> {
    return this.unitOfWork.reader.existsBy(Session, { familyId, revokedAt: IsNull() });
  }

  private async insert(
    manager: EntityManager,
    personId: string,
    familyId: string,
    at: Date,
  ): Promise<OpenSession> {
    const token = randomBytes(32).toString('base64url');
    const expiresAt = new Date(at.getTime() + daysKept * 86_400_000);
    await manager.insert(Session, {
      id: newId(),
      personId,
      familyId,
      tokenHash: sha256(token),
      createdAt: at,
      expiresAt,
    });
    return { personId, familyId, token, expiresAt };
  }
}
