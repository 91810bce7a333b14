import Users from 'lucide-react-native/icons/users';
import { projectParams } from '@/shared/contracts/common';
import { Screen } from '@/components/layout';
import { useLayout } from '@/components/theme';
import { IconButton, NothingHere, ReadView } from '@/components/ui';
import { peoplePath } from '@/client/paths';
import { useRouteParams } from '@/client/use-route-params';
import { useMay, useProject } from '@/features/projects';
import { LocatorBox } from '@/features/residues';
import { Start } from '../components/start';
import { UploadButtons, WhatIsHeld } from '../components/what-is-held';
import { useHoldings } from '../use-holdings';

/** The first place of a project: find a residue, and see what the project holds. */
export function FindScreen() {
  const given = useRouteParams(projectParams);
  return given ? <Find projectId={given.projectId} /> : <NothingHere />;
}

function Find({ projectId }: { projectId: string }) {
  const { hasRail } = useLayout();
  const { data: project } = useProject(projectId);
  const may = useMay(projectId);
  const holdings = useHoldings(projectId);
  const mayUpload = may('upload');
  const held = holdings.data;
  const isEmpty =
    held !== undefined && held.alignments.length + held.structures.length + held.uploads.length === 0;
  const items = [
    { key: 'project', label: 'Project', value: project?.name ?? '' },
    { key: 'type', label: 'Type', value: project?.motorKind ?? '' },
    { key: 'families', label: 'Families', value: held?.families.length ?? '…' },
    { key: 'people', label: 'People', value: held?.members.length ?? '…' },
  ];
  return (
    <Screen
      title={project?.name ?? 'Find'}
      phoneTools={<IconButton icon={Users} label="People and settings" href={peoplePath(projectId)} />}
      items={items}
      actions={mayUpload && held && !isEmpty ? <UploadButtons projectId={projectId} /> : undefined}
    >
      {hasRail ? null : (
        <div role="search" style={{ paddingBottom: 20 }}>
          <LocatorBox projectId={projectId} />
        </div>
      )}
      <ReadView of={holdings} what="what the project holds">
        {(read) =>
          !project ? null : isEmpty ? (
            <Start project={project} holdings={read} mayUpload={mayUpload} />
          ) : (
            <WhatIsHeld project={project} holdings={read} mayUpload={mayUpload} />
          )
        }
      </ReadView>
    </Screen>
  );
}
