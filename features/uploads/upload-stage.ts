import type { Upload } from '@/shared/contracts/uploads';

export interface UploadStage {
  /** The words of the whole way, in order. */
  stages: readonly string[];
  stage: string;
  /** Share of this stage that is done, 0 to 1, where it is known. */
  share?: number;
  state: 'running' | 'waiting' | 'refused' | 'done';
  /** What happens now, as a sentence; empty where the page says it anyway. */
  sentence: string;
}

/** An alignment needs no confirmation: its rows are the proteins. */
export const stagesOf = {
  alignment: ['upload', 'read', 'done'],
  structure: ['upload', 'read', 'map', 'confirm', 'done'],
} as const;

/** Where a file stands on its way, and how it is said. */
export function stageOf(upload: Upload): UploadStage {
  const stages = stagesOf[upload.kind];
  const isMapping = upload.stage === 'map' && upload.kind === 'structure';
  const stage = isMapping ? 'map' : 'read';
  switch (upload.state) {
    case 'received':
      return { stages, stage: 'read', state: 'running', sentence: 'The file is here and waits to be read.' };
    case 'reading':
      return {
        stages,
        stage,
        ...shareOf(upload),
        state: 'running',
        sentence: readingWords(upload, isMapping),
      };
    case 'waiting':
      return {
        stages,
        stage: 'confirm',
        state: 'waiting',
        sentence: 'The map of its chains waits for a curator.',
      };
    case 'refused':
      return { stages, stage, state: 'refused', sentence: '' };
    case 'done':
      return { stages, stage: 'done', state: 'done', sentence: '' };
  }
}

function shareOf({ done, total }: Upload): { share?: number } {
  return total > 0 ? { share: Math.min(1, done / total) } : {};
}

function readingWords({ done, total }: Upload, isMapping: boolean): string {
  if (!isMapping) return 'Reading the file.';
  return total > 0 ? `Matching chain ${Math.min(done + 1, total)} of ${total}.` : 'Matching the chains.';
}
