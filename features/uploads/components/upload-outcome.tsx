import type { Upload } from '@/shared/contracts/uploads';
import { Banner } from '@/components/ui';

/** What became of the file, in a sentence or two. */
export function UploadOutcome({ upload }: { upload: Upload }) {
  const errors = upload.issues.filter(({ severity }) => severity === 'error').length;
  if (upload.state === 'refused') {
    return (
      <Banner kind="danger">
        <b>{`Not stored. ${upload.fileName} has ${errors === 1 ? 'an error' : `${errors} errors`}.`}</b>{' '}
        Nothing of it was taken. The file is kept, so that you can look at it here.
      </Banner>
    );
  }
  if (upload.state !== 'done') return null;
  return (
    <Banner kind="good">
      <b>{`Stored. ${upload.fileName} was read whole.`}</b>{' '}
      {upload.kind === 'alignment'
        ? 'Its rows are proteins of the family now.'
        : 'Each of its protein chains is decided.'}
    </Banner>
  );
}
