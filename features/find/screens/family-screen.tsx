import FileUp from 'lucide-react-native/icons/file-up';
import { id, projectParams } from '@/shared/contracts/common';
import type { Family, ProteinBrief } from '@/shared/contracts/families';
import { PageTitle, Screen } from '@/components/layout';
import { FamilyTag, partWords } from '@/components/residue';
import { useLayout } from '@/components/theme';
import { Button, Caption, Empty, Link, NothingHere, ReadView, Stack, Table } from '@/components/ui';
import { findPath, newUploadPath, proteinPath } from '@/client/paths';
import { useRouteParams } from '@/client/use-route-params';
import { useAlignments } from '@/features/alignments';
import { useFamilies, useProteins } from '@/features/families';
import { useMay } from '@/features/projects';
import { AlignmentList } from '../components/alignment-list';

const params = projectParams.extend({ familyId: id });

/** One family: what it is in the motor, its proteins, and the alignments that say which residues are equivalent. */
export function FamilyScreen() {
  const given = useRouteParams(params);
  const families = useFamilies(given?.projectId ?? '');
  if (!given) return <NothingHere />;
  const { projectId, familyId } = given;
  const family = families.data?.find((one) => one.id === familyId);
  if (family) return <OneFamily projectId={projectId} family={family} />;
  return (
    <Screen title="Family" backHref={findPath(projectId)}>
      <ReadView of={families} what="the family">
        {() => <NothingHere action={<Link href={findPath(projectId)}>What the project holds</Link>} />}
      </ReadView>
    </Screen>
  );
}

function OneFamily({ projectId, family }: { projectId: string; family: Family }) {
  const { hasRail } = useLayout();
  const may = useMay(projectId);
  const mayUpload = may('upload');
  const proteins = useProteins(projectId, family.id);
  const alignments = useAlignments(projectId);
  const own = alignments.data?.filter(({ familyId }) => familyId === family.id);
  const reference = own?.find((one) => one.id === family.referenceAlignmentId);
  const kind = [family.description, partWords[family.part], family.catalytic ? 'catalytic' : '']
    .filter((word, place, all) => word !== '' && all.indexOf(word) === place)
    .join(', ');
  const upload = (
    <Button kind="primary" icon={FileUp} href={newUploadPath(projectId, 'alignment', family.id)}>
      Upload an alignment
    </Button>
  );
  const items = [
    { key: 'family', label: 'Family', value: family.name },
    { key: 'part', label: 'Part', value: partWords[family.part] },
    { key: 'proteins', label: 'Proteins', value: family.proteinCount },
    {
      key: 'reference',
      label: 'Reference',
      value: reference ? `${reference.name}, revision ${reference.revision}` : 'none yet',
    },
  ];
  return (
    <Screen
      title={`Family ${family.name}`}
      backHref={findPath(projectId)}
      items={items}
      actions={mayUpload ? upload : undefined}
    >
      <div style={{ display: 'flex', gap: 12, alignItems: 'flex-start' }}>
        <FamilyTag family={family.name} part={family.part} size={44} />
        <div style={{ flex: 1, minWidth: 0 }}>
          <PageTitle detail={kind} action={hasRail && mayUpload ? upload : undefined}>
            Family {family.name}
          </PageTitle>
          {family.aliases.length > 0 ? <p>{`Also written ${family.aliases.join(', ')}.`}</p> : null}
        </div>
      </div>
      <div
        style={{
          display: 'grid',
          gridTemplateColumns: hasRail ? 'minmax(0,1fr) minmax(0,1fr)' : 'minmax(0,1fr)',
          gap: '24px 44px',
          alignItems: 'start',
          paddingTop: 16,
        }}
      >
        <Stack gap={8}>
          <Caption count={family.proteinCount}>Proteins</Caption>
          <ReadView of={proteins} what="the proteins">
            {(list) =>
              list.length > 0 ? (
                <ProteinTable projectId={projectId} family={family} proteins={list} />
              ) : (
                <Empty title="No protein yet">
                  Each row of an alignment of this family becomes one.
                  {mayUpload ? null : ' Curators and leads upload.'}
                </Empty>
              )
            }
          </ReadView>
        </Stack>
        <Stack gap={8}>
          <Caption count={own?.length}>Alignments</Caption>
          <ReadView of={{ ...alignments, data: own }} what="the alignments">
            {(list) =>
              list.length > 0 ? (
                <AlignmentList projectId={projectId} alignments={list} families={[family]} />
              ) : (
                <Empty title="No alignment yet">
                  The first one says which residues of these proteins are equivalent.
                </Empty>
              )
            }
          </ReadView>
        </Stack>
      </div>
    </Screen>
  );
}

interface ProteinTableProps {
  projectId: string;
  family: Family;
  proteins: readonly ProteinBrief[];
}

function ProteinTable({ projectId, family, proteins }: ProteinTableProps) {
  return (
    <Table
      caption={`Proteins of family ${family.name}`}
      rows={proteins}
      keyOf={({ id: proteinId }) => proteinId}
      columns={[
        {
          key: 'organism',
          header: 'organism',
          rowHeader: true,
          cell: ({ id: proteinId, organism }) => (
            <Link
              href={proteinPath(projectId, proteinId)}
              style={{ display: 'flex', alignItems: 'center', minHeight: 'var(--row)', fontStyle: 'italic' }}
            >
              {organism}
            </Link>
          ),
        },
        { key: 'length', header: 'residues', numeric: true, cell: ({ length }) => length },
      ]}
    />
  );
}
