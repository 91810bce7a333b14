import type { Upload } from '@/shared/contracts/uploads';
import { Card, Link, Stack, StageScale, Text } from '@/components/ui';
import { structurePath, uploadPath } from '@/client/paths';
import { errorWords, stageOf } from '@/features/uploads';

/** Files on their way or refused: each with how far it is, and the page that says more. */
export function UploadList({ projectId, uploads }: { projectId: string; uploads: readonly Upload[] }) {
  return (
    <ul aria-label="Uploads">
      {uploads.map((upload) => {
        const { stages, stage, share, state, sentence } = stageOf(upload);
        const waits = state === 'waiting' && upload.structureId !== null;
        return (
          <li key={upload.id} style={{ paddingBottom: 8 }}>
            <Card>
              <Stack gap={8}>
                <Link href={uploadPath(projectId, upload.id)} className="lone-link">
                  {upload.fileName}
                </Link>
                <StageScale
                  stages={stages}
                  stage={stage}
                  share={share}
                  state={state}
                  sentence={
                    state === 'refused'
                      ? `Refused with ${errorWords(upload.issues)}; nothing was stored.`
                      : sentence
                  }
                  label={`Progress of ${upload.fileName}`}
                />
                {waits && upload.structureId ? (
                  <Link href={structurePath(projectId, upload.structureId)} className="lone-link">
                    Confirm its chains
                  </Link>
                ) : null}
                <Text kind="meta" tone="soft">{`${upload.kind}, from ${upload.by.name}`}</Text>
              </Stack>
            </Card>
          </li>
        );
      })}
    </ul>
  );
}
