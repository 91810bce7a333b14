import { useEffect, useRef } from 'react';
import { useLayout } from '@/components/theme';
import { ReadView, Row, Stack, Text } from '@/components/ui';
import { useExcerpt } from '../use-uploads';
import { FileExcerpt } from './file-excerpt';
import type { KeyedIssue } from './upload-issues';

interface IssuePlaceProps {
  projectId: string;
  uploadId: string;
  issue: KeyedIssue;
  /** It was asked for by hand: on a phone the page moves to it. */
  isAsked: boolean;
}

/** The place of an issue in its file. */
export function IssuePlace({ projectId, uploadId, issue, isAsked }: IssuePlaceProps) {
  const { hasRail } = useLayout();
  const excerpt = useExcerpt(projectId, uploadId, issue.line ?? null, issue.column);
  const top = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (isAsked && !hasRail) top.current?.scrollIntoView({ block: 'start' });
  }, [isAsked, hasRail, issue.key]);
  const { line, column } = issue;
  const title =
    line === undefined
      ? 'The whole file'
      : column === undefined
        ? `Line ${line}`
        : `Line ${line}, column ${column}`;
  return (
    <div ref={top}>
      <Stack gap={12}>
        <Row justify="between" wrap>
          <Text kind="head" heading={2}>
            {title}
          </Text>
          {line === undefined ? null : (
            <Text kind="small" tone="soft">
              counted from 1 in the file
            </Text>
          )}
        </Row>
        {line === undefined ? null : (
          <ReadView of={excerpt} what="the file at this place">
            {(read) => <FileExcerpt excerpt={read} place={{ line, column }} severity={issue.severity} />}
          </ReadView>
        )}
        <Text>{issue.message}</Text>
      </Stack>
    </div>
  );
}
