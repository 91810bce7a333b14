export { JobQueue, claimStatement } from './job-queue';
export { JobRunner } from './job-runner';
export { LeaseLost, type JobControl, type JobHandler } from './job-handler';
export { readAlignmentJob } from './alignment-job';
export { readStructureJob } from './structure-job';
export { WorkerPool } from './worker-pool';
