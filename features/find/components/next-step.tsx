import { useRouter } from 'expo-router';
import FileUp from 'lucide-react-native/icons/file-up';
import Layers from 'lucide-react-native/icons/layers';
import type { Family } from '@/shared/contracts/families';
import { color, useLayout } from '@/components/theme';
import { Banner, Button, Mark, Row, Stack, Text } from '@/components/ui';
import { newUploadPath, uploadPath } from '@/client/paths';
import { sample } from '../sample.data';
import { useSample } from '../use-sample';

interface NextStepProps {
  projectId: string;
  families: readonly Family[];
}

/** The one next step of an empty project: an alignment, one's own or the sample. */
export function NextStep({ projectId, families }: NextStepProps) {
  const router = useRouter();
  const { hasRail } = useLayout();
  const given = useSample(projectId, families, ({ id }) => router.push(uploadPath(projectId, id) as never));
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
        <Row wrap gap={8}>
          <Button kind="primary" icon={FileUp} href={newUploadPath(projectId, 'alignment')}>
            Upload an alignment
          </Button>
          {given ? (
            <Button
              onPress={() => void given.send()}
              busyText={given.isSending ? 'Uploading the sample' : undefined}
            >
              {`Use the sample: family ${sample.family}, ${sample.rowCount} rows`}
            </Button>
          ) : null}
        </Row>
        {given?.problem ? <Banner kind="danger">{given.problem.message}</Banner> : null}
      </Stack>
    </section>
  );
}
