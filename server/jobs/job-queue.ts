import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import type { Unit, UnitOfWork } from '../db';
import { Job } from '../db/entities';
import { LeaseLost, type ClaimedJob } from './job-handler';

/** Audit entries of a machine's own doing would carry this; jobs write none of their own. */
const nobody = '00000000-0000-0000-0000-000000000000';

/**
 * Takes the next job through the index (state, run_at, id), which is in this order: only the row that is taken is
 * locked, and takers pass over each other's.
 */
export const claimStatement =
  "SELECT id, kind, project_id, subject_id, attempts, error FROM job WHERE state = 'ready' AND run_at <= ?" +
  ' ORDER BY run_at, id LIMIT 1 FOR UPDATE SKIP LOCKED';

interface ClaimRow {
  id: string;
  kind: string;
  project_id: string;
  subject_id: string;
  attempts: number;
  error: string | null;
}

type LeaseEnd = Partial<Omit<Job, 'id' | 'payload'>>;

export interface Progress {
  stage: string;
  done: number;
  total: number;
}

/** Jobs as rows: taken for a while, kept by heartbeats, finished by their taker alone. */
export class JobQueue {
  /** One name for each process. */
  readonly taker = `${process.pid}-${randomUUID()}`;

  constructor(
    private readonly unitOfWork: UnitOfWork,
    readonly leaseMilliseconds = 30_000,
  ) {}

  /** The next job that is due, now leased to this taker; null when there is none. */
  claim(now = new Date()): Promise<ClaimedJob | null> {
    return this.unitOfWork.write({ projectId: null, actorId: nobody }, async ({ manager }) => {
      const rows: ClaimRow[] = await manager.query(claimStatement, [now]);
      const row = rows[0];
      if (!row) return null;
      const attempts = row.attempts + 1;
      await manager.update(
        Job,
        { id: row.id },
        { state: 'running', attempts, leasedBy: this.taker, leaseUntil: this.leaseEnd(now) },
      );
      return {
        id: String(row.id),
        kind: row.kind,
        projectId: row.project_id,
        subjectId: row.subject_id,
        attempts,
        failed: row.error !== null,
      };
    });
  }

  /** Jobs whose taker stopped giving signs are free again. */
  async releaseExpired(now = new Date()): Promise<void> {
    await this.unitOfWork.reader
      .createQueryBuilder()
      .update(Job)
      .set({ state: 'ready', leasedBy: null, leaseUntil: null, error: null })
      .where("state = 'running' AND lease_until < :now", { now })
      .execute();
  }

  /** Keeps the lease and stores how far the work is; false when the lease is lost. */
  async heartbeat(job: ClaimedJob, progress: Progress, now = new Date()): Promise<boolean> {
    const { affected } = await this.unitOfWork.reader
      .createQueryBuilder()
      .update(Job)
      .set({ leaseUntil: this.leaseEnd(now), ...progress })
      .where({ id: job.id, leasedBy: this.taker, state: 'running' })
      .execute();
    return affected === 1;
  }

  /** Inside the unit that writes the result, before anything else: a job that ran twice stores once. */
  async complete(unit: Unit, job: ClaimedJob, state: 'done' | 'failed'): Promise<void> {
    if (!(await this.leave(unit.manager, job, { state, leaseUntil: null, stage: '', done: 0, total: 0 })))
      throw new LeaseLost();
  }

  /** Gives the job back, to be taken again after a while. */
  async release(job: ClaimedJob, waitMilliseconds: number, error: string | null): Promise<void> {
    const runAt = new Date(Date.now() + waitMilliseconds);
    await this.leave(this.unitOfWork.reader, job, {
      state: 'ready',
      runAt,
      leaseUntil: null,
      leasedBy: null,
      error,
    });
  }

  private async leave(manager: EntityManager, job: ClaimedJob, change: LeaseEnd): Promise<boolean> {
    const { affected } = await manager
      .createQueryBuilder()
      .update(Job)
      .set(change)
      .where({ id: job.id, leasedBy: this.taker, state: 'running' })
      .execute();
    return affected === 1;
  }

  private leaseEnd(now: Date): Date {
    return new Date(now.getTime() + this.leaseMilliseconds);
  }
}
