import { useState } from 'react';
import { uploads, type Upload } from '@/shared/contracts/uploads';
import { PageTitle, Panes, Screen, type PaneItem } from '@/components/layout';
import { NothingHere, ReadView } from '@/components/ui';
import { findPath } from '@/client/paths';
import { useRouteParams } from '@/client/use-route-params';
import { useMay } from '@/features/projects';
import { IssuePlace } from '../components/issue-place';
import { keyed } from '../components/upload-issues';
import { hasNext, UploadNext } from '../components/upload-next';
import { UploadReport } from '../components/upload-report';
import { fileSizeWords } from '../file-size';
import { useUpload } from '../use-uploads';
import { useWayToMap } from '../use-way-to-map';

/** One file: how far it is, and everything wrong or doubtful in it. */
export function UploadScreen() {
  const params = useRouteParams(uploads.read.params);
  if (params) return <OneUpload {...params} />;
  return (
    <Screen title="Upload">
      <PageTitle quietOnPhone>Upload</PageTitle>
      <NothingHere />
    </Screen>
  );
}

function OneUpload({ projectId, uploadId }: { projectId: string; uploadId: string }) {
  const upload = useUpload(projectId, uploadId);
  const may = useMay(projectId);
  useWayToMap(projectId, upload.data, may('confirm map'));
  if (upload.data) return <UploadPage projectId={projectId} upload={upload.data} />;
  return (
    <Screen title="Upload" backHref={findPath(projectId)}>
      <PageTitle quietOnPhone>Upload</PageTitle>
      <ReadView of={upload} what="the upload">
        {() => null}
      </ReadView>
    </Screen>
  );
}

const titles: Record<Upload['state'], string> = {
  received: 'Upload',
  reading: 'Upload',
  waiting: 'Upload',
  done: 'Stored',
  refused: 'Not stored',
};

function UploadPage({ projectId, upload }: { projectId: string; upload: Upload }) {
  const [asked, setAsked] = useState<string>();
  const issues = keyed(upload.issues);
  const errors = issues.filter(({ severity }) => severity === 'error');
  // A refused file opens at its first error that has a place.
  const first = upload.state === 'refused' ? errors.find(({ line }) => line !== undefined) : undefined;
  const open = issues.find(({ key }) => key === asked) ?? first;
  const report: PaneItem = {
    key: 'report',
    label: 'The file',
    content: (
      <UploadReport
        projectId={projectId}
        upload={upload}
        issues={issues}
        openKey={open?.key}
        onOpen={setAsked}
      />
    ),
  };
  const place: PaneItem | null = open
    ? {
        key: 'place',
        label: 'The place in the file',
        widthPixels: 540,
        content: (
          <IssuePlace projectId={projectId} uploadId={upload.id} issue={open} isAsked={open.key === asked} />
        ),
      }
    : null;
  return (
    <Screen
      title={titles[upload.state]}
      backHref={findPath(projectId)}
      kind="panes"
      items={[
        { key: 'file', label: 'File', value: upload.fileName },
        { key: 'size', label: 'Size', value: fileSizeWords(upload.bytes) },
        { key: 'errors', label: 'Errors', value: errors.length },
        { key: 'warnings', label: 'Warnings', value: issues.length - errors.length },
      ]}
      actions={hasNext(upload) ? <UploadNext projectId={projectId} upload={upload} onPhone /> : undefined}
    >
      <Panes name="upload" panes={place ? [report, place] : [report]} />
    </Screen>
  );
}
