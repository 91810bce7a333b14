import { useRouter } from 'expo-router';
import Users from 'lucide-react-native/icons/users';
import { projectParams } from '@/shared/contracts/common';
import { Screen } from '@/components/layout';
import { useLayout } from '@/components/theme';
import { IconButton, NothingHere, ReadView } from '@/components/ui';
import { peoplePath, uploadPath } from '@/client/paths';
import { useRouteParams } from '@/client/use-route-params';
import { useMay, useProject } from '@/features/projects';
import { LocatorBox } from '@/features/residues';
import { NextStepButtons } from '../components/next-step';
import { Start } from '../components/start';
import { UploadButtons, WhatIsHeld } from '../components/what-is-held';
import { useHoldings } from '../use-holdings';
import { useSample } from '../use-sample';

/** The first place of a project: find a residue, and see what the project holds. */
export function FindScreen() {
  const given = useRouteParams(projectParams);
  return given ? <Find projectId={given.projectId} /> : <NothingHere />;
}

function Find({ projectId }: { projectId: string }) {
  const { hasRail } = useLayout();
  const router = useRouter();
  const { data: project } = useProject(projectId);
  const may = useMay(projectId);
  const holdings = useHoldings(projectId);
  const mayUpload = may('upload');
  const held = holdings.data;
  const sample = useSample(projectId, held?.families ?? [], ({ id }) =>
    router.push(uploadPath(projectId, id) as never),
  );
  const isEmpty =
    held !== undefined && held.alignments.length + held.structures.length + held.uploads.length === 0;
  const items = [
    { key: 'project', label: 'Project', value: project?.name ?? '' },
    { key: 'type', label: 'Type', value: project?.motorKind ?? '' },
    { key: 'families', label: 'Families', value: held?.families.length ?? '…' },
    { key: 'people', label: 'People', value: held?.members.length ?? '…' },
  ];
  const actions = isEmpty ? (
    <NextStepButtons projectId={projectId} sample={sample} />
  ) : (
    <UploadButtons projectId={projectId} holdings={held ?? { alignments: [], structures: [] }} />
  );
  return (
    <Screen
      title={project?.name ?? 'Find'}
      phoneTools={<IconButton icon={Users} label="People and settings" href={peoplePath(projectId)} />}
      items={items}
      actions={mayUpload && held ? actions : undefined}
    >
      {hasRail ? null : (
        <div role="search" style={{ paddingBottom: 20 }}>
          <LocatorBox projectId={projectId} />
        </div>
      )}
      <ReadView of={holdings} what="what the project holds">
        {(read) =>
          !project ? null : isEmpty ? (
            <Start project={project} holdings={read} mayUpload={mayUpload} sample={sample} />
          ) : (
            <WhatIsHeld project={project} holdings={read} mayUpload={mayUpload} />
          )
        }
      </ReadView>
    </Screen>
  );
}
