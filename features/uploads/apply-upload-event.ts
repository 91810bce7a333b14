import type { Upload } from '@/shared/contracts/uploads';
import type { Fact } from '@/client/facts';
import { keepNewer, newestFirst, putNewer } from '@/client/keep-newer';

/** Newest first. */
export function applyToUploads(list: Upload[], fact: Fact): Upload[] {
  if (fact.kind !== 'upload.changed') return list;
  return putNewer(list, fact.payload, newestFirst);
}

export function applyToUpload(upload: Upload, fact: Fact): Upload {
  return fact.kind === 'upload.changed' && fact.payload.id === upload.id
    ? keepNewer(upload, fact.payload)
    : upload;
}

/** A hint on how far a file is read; it says nothing once the file is read. */
export function withHint(
  upload: Upload,
  hint: { stage: string; done: number; total: number } | undefined,
): Upload {
  if (!hint || (upload.state !== 'received' && upload.state !== 'reading')) return upload;
  return { ...upload, stage: hint.stage, done: hint.done, total: hint.total };
}
