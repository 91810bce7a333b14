import type { Upload } from '@/shared/contracts/uploads';
import { PageTitle } from '@/components/layout';
import { useLayout } from '@/components/theme';
import { Row, Stack, StageScale, Text, Time } from '@/components/ui';
import { fileSizeWords } from '../file-size';
import { stageOf } from '../upload-stage';
import { UploadIssues, type KeyedIssue } from './upload-issues';
import { UploadNext } from './upload-next';
import { UploadOutcome } from './upload-outcome';

interface UploadReportProps {
  projectId: string;
  upload: Upload;
  issues: readonly KeyedIssue[];
  openKey?: string;
  onOpen: (key: string) => void;
}

/** How far a file is, and what was found in it. */
export function UploadReport({ projectId, upload, issues, openKey, onOpen }: UploadReportProps) {
  const { hasRail } = useLayout();
  const isUnderWay = upload.state === 'received' || upload.state === 'reading';
  return (
    <Stack gap={16}>
      <div>
        <PageTitle>{upload.fileName}</PageTitle>
        <Text kind="small" tone="soft">
          {fileSizeWords(upload.bytes)} · uploaded by {upload.by.name}, <Time iso={upload.at} />
          {isUnderWay ? ' · leave any time, the work goes on' : ''}
        </Text>
      </div>
      <StageScale {...stageOf(upload)} label="Upload" />
      <UploadOutcome projectId={projectId} upload={upload} />
      {hasRail ? (
        <Row wrap>
          <UploadNext projectId={projectId} upload={upload} />
        </Row>
      ) : null}
      <UploadIssues
        issues={issues}
        isRefused={upload.state === 'refused'}
        openKey={openKey}
        onOpen={onOpen}
      />
    </Stack>
  );
}
