import { StageScale } from '@/components/ui';
import type { Upload } from '@/shared/contracts/uploads';
import { stagesOf } from '../upload-stage';

interface SendingProps {
  kind: Upload['kind'];
  fileName: string;
  share: number | null;
}

/** A file on its way to the server. */
export function Sending({ kind, fileName, share }: SendingProps) {
  const percent = share === null ? '' : `, ${Math.round(share * 100)} %`;
  const sentence =
    share === 1 ? `${fileName} has arrived and is being stored.` : `Sending ${fileName}${percent}.`;
  return (
    <StageScale
      stages={stagesOf[kind]}
      stage="upload"
      share={share ?? 0}
      sentence={sentence}
      label="Upload"
    />
  );
}
