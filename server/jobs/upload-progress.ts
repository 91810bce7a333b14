import type { JobControl } from './job-handler';

/** Where an upload is, told to whoever looks at it; never stored, never counted. */
export interface ProgressHint {
  uploadId: string;
  projectId: string;
  stage: string;
  done: number;
  total: number;
}

const shortestPauseMilliseconds = 250;

/** At most four hints a second; a new stage is told at once. */
export function uploadProgress(
  upload: { uploadId: string; projectId: string },
  control: JobControl,
  onProgress: (hint: ProgressHint) => void,
): (stage: string, done: number, total: number) => void {
  let lastStage = '';
  let lastAt = 0;
  return (stage, done, total) => {
    control.progress(stage, done, total);
    const now = Date.now();
    if (stage === lastStage && now - lastAt < shortestPauseMilliseconds) return;
    lastStage = stage;
    lastAt = now;
    onProgress({ ...upload, stage, done, total });
  };
}
