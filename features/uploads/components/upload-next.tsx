import FileUp from 'lucide-react-native/icons/file-up';
import type { Upload } from '@/shared/contracts/uploads';
import { Button } from '@/components/ui';
import { alignmentPath, familyPath, newUploadPath, structurePath } from '@/client/paths';
import { useMay } from '@/features/projects';

interface UploadNextProps {
  projectId: string;
  upload: Upload;
  /** Short words, side by side under the thumb. */
  onPhone?: boolean;
}

/** Whether there is anything to go on to. */
export const hasNext = ({ state }: Upload): boolean =>
  state === 'waiting' || state === 'done' || state === 'refused';

/** Where to go on from here. */
export function UploadNext({ projectId, upload, onPhone = false }: UploadNextProps) {
  const may = useMay(projectId);
  const { kind, state, familyId, alignmentId, structureId } = upload;
  if (state === 'refused') {
    if (!may('upload')) return null;
    return (
      <Button
        kind="primary"
        icon={FileUp}
        full={onPhone}
        href={newUploadPath(projectId, kind, familyId ?? undefined)}
      >
        Upload the mended file
      </Button>
    );
  }
  if (structureId) {
    const words = state === 'waiting' && may('confirm map') ? 'Confirm the map' : 'Open the structure';
    return (
      <Button kind="primary" full={onPhone} href={structurePath(projectId, structureId)}>
        {words}
      </Button>
    );
  }
  return (
    <>
      {familyId ? (
        <Button full={onPhone} href={familyPath(projectId, familyId)}>
          {onPhone ? 'Family' : 'Open the family'}
        </Button>
      ) : null}
      {alignmentId ? (
        <Button kind="primary" full={onPhone} href={alignmentPath(projectId, alignmentId)}>
          {onPhone ? 'Alignment' : 'Open the alignment'}
        </Button>
      ) : null}
    </>
  );
}
