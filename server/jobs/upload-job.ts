import type { Issue } from '../../shared/sequence/parse-result';
import type { Unit, UnitOfWork } from '../db';
import { notFound } from '../lib/problem';
import { cappedIssues, Upload, type UploadStates } from '../modules/uploads';
import type { FileStore } from '../storage';
import { LeaseLost, type ClaimedJob, type JobControl, type JobHandler } from './job-handler';
import { uploadProgress, type ProgressHint } from './upload-progress';
import { WorkerGone, type OnWorkerProgress } from './worker-pool';

export interface UploadJobParts {
  unitOfWork: UnitOfWork;
  files: FileStore;
  states: UploadStates;
  /** Hints for whoever looks on, at most four a second and upload. */
  onProgress: (hint: ProgressHint) => void;
}

interface ReadingTask<Value> {
  /** Reads the file in a worker; null with issues when it cannot be used. */
  read(
    upload: Upload,
    file: string,
    signal: AbortSignal,
    onProgress: OnWorkerProgress,
  ): Promise<{ value: Value | null; issues: Issue[] }>;
  /** Writes everything the file holds, inside the unit that finishes the job. */
  store(unit: Unit, upload: Upload, value: Value, issues: Issue[]): Promise<void>;
}

/** What the reading of any upload has in common: state, worker, and one unit for the result. */
export function uploadJob<Value>(parts: UploadJobParts, task: ReadingTask<Value>): JobHandler {
  const { unitOfWork, files, states } = parts;
  const scope = (upload: Upload) => ({ projectId: upload.projectId, actorId: upload.createdBy });
  const refuse = (upload: Upload, control: JobControl, issues: Issue[]) =>
    unitOfWork.write(scope(upload), async (unit) => {
      await control.complete(unit);
      await states.refuse(unit, upload.id, issues);
    });

  async function run(job: ClaimedJob, control: JobControl): Promise<void> {
    const upload = await loadUpload(unitOfWork, job);
    await unitOfWork.write(scope(upload), (unit) => states.begin(unit, upload.id));
    const progress = uploadProgress(
      { uploadId: upload.id, projectId: upload.projectId },
      control,
      parts.onProgress,
    );
    const reading = await readOrIssue(() =>
      task.read(upload, files.pathOf(upload.fileHash), control.signal, ({ stage, done, total }) =>
        progress(stage, done, total),
      ),
    );
    const { value } = reading;
    const issues = cappedIssues(reading.issues);
    if (value === null) return refuse(upload, control, issues);
    await unitOfWork.write(scope(upload), async (unit) => {
      await control.complete(unit);
      await task.store(unit, upload, value, issues);
    });
  }

  return {
    run,
    async giveUp(job, control) {
      const upload = await loadUpload(unitOfWork, job);
      await refuse(upload, control, [gaveUp]);
    },
  };
}

async function loadUpload(unitOfWork: UnitOfWork, job: ClaimedJob): Promise<Upload> {
  const upload = await unitOfWork.reader.findOneBy(Upload, { id: job.subjectId });
  if (!upload) throw notFound('upload');
  // Finished by somebody else between the claim and now: there is nothing left to do.
  if (upload.state !== 'received' && upload.state !== 'reading') throw new LeaseLost();
  return upload;
}

async function readOrIssue<Value>(
  read: () => Promise<{ value: Value | null; issues: Issue[] }>,
): Promise<{ value: Value | null; issues: Issue[] }> {
  try {
    return await read();
  } catch (error) {
    if (!(error instanceof WorkerGone)) throw error;
    return { value: null, issues: [error.tooMuchMemory ? tooMuchMemory : brokeOff] };
  }
}

const tooMuchMemory: Issue = {
  code: 'too-much-memory',
  severity: 'error',
  message: 'Reading this file takes more memory than this server gives it. Upload a smaller part of it.',
};
const brokeOff: Issue = {
  code: 'reading-broke-off',
  severity: 'error',
  message: 'Reading this file broke off: it brings the reader down. Save it anew, or upload a part of it.',
};
const gaveUp: Issue = {
  code: 'reading-failed',
  severity: 'error',
  message: 'Reading this file failed several times, by a fault of this server. Upload it again later.',
};
