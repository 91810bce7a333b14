import type { Unit } from '../db';

export interface ClaimedJob {
  id: string;
  kind: string;
  projectId: string;
  subjectId: string;
  /** How often it was taken, this time included. */
  attempts: number;
  /** The last attempt ended by an error, not by the end of its process. */
  failed: boolean;
}

/** The job is no longer this taker's: somebody else has it, or it is finished. Nothing may be written for it. */
export class LeaseLost extends Error {
  constructor() {
    super('The lease on this job is lost.');
  }
}

export interface JobControl {
  /** Aborted when the lease is lost or the server stops. */
  signal: AbortSignal;
  /** Kept with the job at its next heartbeat. */
  progress(stage: string, done: number, total: number): void;
  /** First in the unit that writes the result: the job is done with it, or the unit is refused. */
  complete(unit: Unit): Promise<void>;
}

export interface JobHandler {
  /** Does the work and writes its result in one unit that begins with `control.complete`. */
  run(job: ClaimedJob, control: JobControl): Promise<void>;
  /** Says, where people look, that the work was given up; again in one unit that begins with `complete`. */
  giveUp(job: ClaimedJob, control: JobControl): Promise<void>;
}
