import type { Upload } from '@/shared/contracts/uploads';
import { Caption, IssueList, Stack, type IssueView } from '@/components/ui';

export type KeyedIssue = Upload['issues'][number] & { key: string };

export const keyed = (issues: Upload['issues']): KeyedIssue[] =>
  issues.map((issue, at) => ({ ...issue, key: String(at) }));

export const toView = ({ key, severity, line, column, message }: KeyedIssue): IssueView => ({
  key,
  severity,
  line,
  column,
  sentence: message,
});

interface UploadIssuesProps {
  issues: readonly KeyedIssue[];
  isRefused: boolean;
  openKey?: string;
  onOpen: (key: string) => void;
}

/** What stops a file and what is doubtful in it, errors first. */
export function UploadIssues({ issues, isRefused, openKey, onOpen }: UploadIssuesProps) {
  const errors = issues.filter(({ severity }) => severity === 'error');
  const warnings = issues.filter(({ severity }) => severity === 'warning');
  const list = (label: string, rows: readonly KeyedIssue[]) => (
    <IssueList
      label={label}
      issues={rows.map(toView)}
      selectedKey={openKey}
      onOpen={({ key }) => onOpen(key)}
    />
  );
  return (
    <Stack gap={20}>
      {errors.length > 0 ? (
        <Stack gap={4}>
          <Caption count={`${errors.length}, ${errors.length === 1 ? 'it stops' : 'each stops'} the upload`}>
            Errors
          </Caption>
          {list('Errors', errors)}
        </Stack>
      ) : null}
      {warnings.length > 0 ? (
        <Stack gap={4}>
          <Caption count={`${warnings.length}, ${isRefused ? 'would be taken' : 'taken'} with a mark`}>
            Warnings
          </Caption>
          {list('Warnings', warnings)}
        </Stack>
      ) : null}
    </Stack>
  );
}
