import { useRouter } from 'expo-router';
import type { z } from 'zod';
import { id, projectParams } from '@/shared/contracts/common';
import { uploadKind } from '@/shared/contracts/uploads';
import { PageTitle, Screen } from '@/components/layout';
import { Empty, NothingHere, ReadView, Segment, Stack } from '@/components/ui';
import { findPath } from '@/client/paths';
import { useRouteParams } from '@/client/use-route-params';
import { useMay, useProject } from '@/features/projects';
import { NewUploadForm } from '../components/new-upload-form';

const params = projectParams.extend({ kind: uploadKind.default('alignment'), familyId: id.optional() });
const kinds = [
  { value: 'alignment', label: 'Alignment' },
  { value: 'structure', label: 'Structure' },
];

/** A new file for the project: an alignment of one family, or a structure. */
export function NewUploadScreen() {
  const given = useRouteParams(params);
  if (given) return <NewUpload {...given} />;
  return (
    <Screen title="Upload">
      <PageTitle quietOnPhone>Upload</PageTitle>
      <NothingHere />
    </Screen>
  );
}

function NewUpload({ projectId, kind, familyId }: z.output<typeof params>) {
  const router = useRouter();
  const project = useProject(projectId);
  const may = useMay(projectId);
  const form = (
    <Stack gap={16}>
      <Segment
        label="What the file is"
        options={kinds}
        value={kind}
        onChange={(value) => router.setParams({ kind: value })}
      />
      <NewUploadForm key={kind} projectId={projectId} kind={kind} familyId={familyId} />
    </Stack>
  );
  return (
    <Screen title="Upload a file" backHref={findPath(projectId)} narrow>
      <Stack gap={16}>
        <PageTitle quietOnPhone>Upload a file</PageTitle>
        <ReadView of={project} what="the project">
          {() => (may('upload') ? form : <NotForReaders />)}
        </ReadView>
      </Stack>
    </Screen>
  );
}

function NotForReaders() {
  return (
    <Empty title="Uploading is for curators and leads">
      Ask one of them to bring the file, or a lead to make you a curator.
    </Empty>
  );
}
