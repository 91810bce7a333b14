import FileUp from 'lucide-react-native/icons/file-up';
import Layers from 'lucide-react-native/icons/layers';
import { color, useLayout } from '@/components/theme';
import { Banner, Button, Mark, Row, Stack, Text } from '@/components/ui';
import { newUploadPath } from '@/client/paths';
import { sample as words } from '../sample.data';
import type { Sample } from '../use-sample';

interface NextStepProps {
  projectId: string;
  sample: Sample | null;
}

/** The one next step of an empty project: an alignment, one's own or the sample. */
export function NextStep({ projectId, sample }: NextStepProps) {
  const { hasRail } = useLayout();
  return (
    <section
      aria-label="Next step"
      style={{
        padding: hasRail ? '32px 36px' : 20,
        border: `1.5px dashed ${color.lineControl}`,
        borderRadius: 4,
        background: color.raised,
      }}
    >
      <Stack gap={12}>
        <Mark tone="accent" icon={Layers}>
          next step
        </Mark>
        <Text kind="head" heading={2}>
          Upload an alignment of one family
        </Text>
        <Text tone="soft">
          Aligned FASTA. Every problem is listed with line and column; nothing is half stored.
        </Text>
        {sample ? (
          <Text tone="soft">{`The sample is family ${words.family} of ${words.rowCount} invented organisms.`}</Text>
        ) : null}
        {hasRail ? (
          <Row wrap gap={8}>
            <NextStepButtons projectId={projectId} sample={sample} />
          </Row>
        ) : null}
        {sample?.problem ? <Banner kind="danger">{sample.problem.message}</Banner> : null}
      </Stack>
    </section>
  );
}

/** In the step itself on a wide screen, under the thumb on a phone. */
export function NextStepButtons({ projectId, sample }: NextStepProps) {
  const { hasRail } = useLayout();
  const upload = (
    <Button kind="primary" icon={FileUp} href={newUploadPath(projectId, 'alignment')}>
      {hasRail ? 'Upload an alignment' : 'Upload a file'}
    </Button>
  );
  const useIt = sample ? (
    <Button
      onPress={() => void sample.send()}
      busyText={sample.isSending ? 'Uploading the sample' : undefined}
    >
      {hasRail ? `Use the sample: family ${words.family}, ${words.rowCount} rows` : 'Use the sample'}
    </Button>
  ) : null;
  return hasRail ? (
    <>
      {upload}
      {useIt}
    </>
  ) : (
    <>
      {useIt}
      {upload}
    </>
  );
}
