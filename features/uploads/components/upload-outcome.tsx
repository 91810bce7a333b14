import type { Upload } from '@/shared/contracts/uploads';
import { Banner, countWords } from '@/components/ui';
import { useAlignments } from '@/features/alignments';
import { errorWords } from '../error-words';

/** What became of the file, in a sentence or two. */
export function UploadOutcome({ projectId, upload }: { projectId: string; upload: Upload }) {
  if (upload.state === 'refused') {
    return (
      <Banner kind="danger">
        <b>{`Not stored. ${upload.fileName} has ${errorWords(upload.issues)}.`}</b> Nothing of it was taken.
        The file is kept, so that you can look at it here.
      </Banner>
    );
  }
  if (upload.state !== 'done') return null;
  return (
    <Banner kind="good">
      <b>{`Stored. ${upload.fileName} was read whole.`}</b>{' '}
      {upload.kind === 'alignment' ? (
        <AlignmentTaken projectId={projectId} alignmentId={upload.alignmentId} />
      ) : (
        'Each of its protein chains is decided.'
      )}
    </Banner>
  );
}

/** What came of the rows, counted as soon as the alignment is read. */
function AlignmentTaken({ projectId, alignmentId }: { projectId: string; alignmentId: string | null }) {
  const taken = useAlignments(projectId).data?.find(({ id }) => id === alignmentId);
  if (!taken) return 'Its rows are proteins of the family now.';
  const rows = countWords(taken.rowCount, 'row');
  return `${rows}, ${countWords(taken.columnCount, 'column')}; each row is a protein of the family now.`;
}
