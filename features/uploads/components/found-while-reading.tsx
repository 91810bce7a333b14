import type { Upload } from '@/shared/contracts/uploads';
import { Caption, counted, IssueList, Link, Stack } from '@/components/ui';
import { keyed, toView } from './upload-issues';

interface FoundWhileReadingProps {
  issues: Upload['issues'];
  /** The upload, where they stand beside the text of the file. */
  uploadHref: string | undefined;
}

/** What was doubtful in the file that something came from; nothing when all of it was clear. */
export function FoundWhileReading({ issues, uploadHref }: FoundWhileReadingProps) {
  if (issues.length === 0) return null;
  return (
    <Stack gap={4}>
      <Caption
        count={counted(issues.length, 'warning')}
        action={uploadHref ? <Link href={uploadHref}>In the file</Link> : undefined}
      >
        Found while reading
      </Caption>
      <IssueList label="Found while reading" issues={keyed(issues).map(toView)} />
    </Stack>
  );
}
