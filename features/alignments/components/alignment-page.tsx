import FileUp from 'lucide-react-native/icons/file-up';
import type { Family } from '@/shared/contracts/families';
import { PageTitle, Screen } from '@/components/layout';
import { FamilyTag } from '@/components/residue';
import { useLayout } from '@/components/theme';
import { Button, Caption, Row, Stack, Text, Time } from '@/components/ui';
import { familyPath, findPath, newUploadPath, uploadPath } from '@/client/paths';
import { useMay } from '@/features/projects';
import { FoundWhileReading, useUploads } from '@/features/uploads';
import type { AlignmentWithRows } from '../apply-alignment-event';
import { AlignmentRows } from './alignment-rows';

interface AlignmentPageProps {
  projectId: string;
  alignment: AlignmentWithRows;
  family: Family | undefined;
}

const formatWords: Record<string, string> = { fasta: 'aligned FASTA' };

/** An alignment as it was read: what it is, what was doubtful, and its rows. */
export function AlignmentPage({ projectId, alignment, family }: AlignmentPageProps) {
  const { hasRail } = useLayout();
  const mayUpload = useMay(projectId)('upload');
  const { name, familyId, revision, isReference, rowCount, columnCount, issues } = alignment;
  const familyName = family?.name ?? '';
  const source = useUploads(projectId).data?.find(({ alignmentId }) => alignmentId === alignment.id);
  const upload = mayUpload ? (
    <Button icon={FileUp} full={!hasRail} href={newUploadPath(projectId, 'alignment', familyId)}>
      {`Upload another of ${familyName}`}
    </Button>
  ) : undefined;
  return (
    <Screen
      title={`Alignment ${familyName}`}
      backHref={findPath(projectId)}
      actions={upload}
      items={[
        {
          key: 'alignment',
          label: 'Alignment',
          value: `${familyName}, revision ${revision}${isReference ? ', reference' : ''}`,
        },
        { key: 'rows', label: 'Rows', value: rowCount },
        { key: 'columns', label: 'Columns', value: `1 to ${columnCount}` },
        { key: 'format', label: 'Read as', value: formatWords[alignment.format] ?? alignment.format },
      ]}
    >
      <Stack gap={16}>
        <Row gap={12} wrap>
          {family ? (
            <FamilyTag family={family.name} part={family.part} href={familyPath(projectId, familyId)} />
          ) : null}
          <div style={{ flex: '1 1 240px', minWidth: 0 }}>
            <PageTitle detail={`revision ${revision}${isReference ? ', reference of the family' : ''}`}>
              {name}
            </PageTitle>
            <Text kind="small" tone="soft">
              {alignment.fileName} · uploaded by {alignment.by.name}, <Time iso={alignment.at} />
            </Text>
          </div>
          {hasRail ? upload : null}
        </Row>
        <FoundWhileReading issues={issues} uploadHref={source && uploadPath(projectId, source.id)} />
        <Stack gap={8}>
          <Caption count={`${rowCount}, each a protein of the family`}>Rows</Caption>
          <AlignmentRows projectId={projectId} alignment={alignment} />
        </Stack>
      </Stack>
    </Screen>
  );
}
