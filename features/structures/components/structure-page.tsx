import { useLocalSearchParams, useRouter } from 'expo-router';
import { useMemo } from 'react';
import type { Family } from '@/shared/contracts/families';
import type { StructureWithChains } from '@/shared/contracts/structures';
import { Panes, Screen, type PaneItem } from '@/components/layout';
import { findPath, uploadPath } from '@/client/paths';
import { countOf, groupChains, useConfirmReady, useDecideChains } from '@/features/maps';
import { useMay } from '@/features/projects';
import { useUploads } from '@/features/uploads';
import { ConfirmReady } from './confirm-ready';
import { OpenChain } from './open-chain';
import { StructureReport } from './structure-report';

interface StructurePageProps {
  projectId: string;
  structure: StructureWithChains;
  families: readonly Family[];
}

/** All chains at the left, the open one at the right; the address says which is open. */
export function StructurePage({ projectId, structure, families }: StructurePageProps) {
  const router = useRouter();
  const { chain: asked } = useLocalSearchParams<{ chain?: string }>();
  const mayConfirm = useMay(projectId)('confirm map');
  const deciding = useDecideChains(projectId);
  const confirmReady = useConfirmReady(projectId);
  const upload = useUploads(projectId).data?.find(({ structureId }) => structureId === structure.id);
  const groups = useMemo(() => groupChains(structure.chains), [structure.chains]);
  const byId = useMemo(() => new Map(families.map((family) => [family.id, family])), [families]);
  const open = groups.find(({ chains }) => chains.some(({ authorId }) => authorId === asked)) ?? groups[0];
  const ready = countOf(groups, 'ready');
  const confirm = (full: boolean) =>
    mayConfirm && ready > 0 ? (
      <ConfirmReady
        ready={ready}
        left={structure.waiting - ready}
        isPending={confirmReady.isPending}
        full={full}
        onPress={() => confirmReady.mutate({ structureId: structure.id })}
      />
    ) : undefined;
  const report: PaneItem = {
    key: 'chains',
    label: 'Chains',
    content: (
      <StructureReport
        structure={structure}
        groups={groups}
        families={byId}
        openKey={open?.key}
        onOpen={({ first }) => router.setParams({ chain: first.authorId })}
        mayConfirm={mayConfirm}
        problem={confirmReady.error?.message ?? null}
        isConfirmed={confirmReady.isSuccess && ready === 0}
        uploadHref={upload && uploadPath(projectId, upload.id)}
        confirm={confirm(false)}
      />
    ),
  };
  const chain: PaneItem | null = open
    ? {
        key: 'chain',
        label: 'The open chain',
        widthPixels: 420,
        content: (
          <OpenChain
            projectId={projectId}
            group={open}
            families={families}
            deciding={mayConfirm ? deciding : null}
            isPrimary={ready === 0}
            isAsked={asked !== undefined}
          />
        ),
      }
    : null;
  return (
    <Screen
      title={structure.waiting > 0 && mayConfirm ? 'Confirm the map' : 'Structure'}
      backHref={findPath(projectId)}
      kind="panes"
      items={[
        { key: 'numbers', label: 'Chain numbers', value: 'author' },
        { key: 'file', label: 'File', value: `${structure.name}, revision ${structure.revision}` },
        { key: 'chains', label: 'Chains', value: structure.chainCount },
        { key: 'waiting', label: 'Waiting', value: structure.waiting },
      ]}
      actions={confirm(true)}
    >
      <Panes name="structure" panes={chain ? [report, chain] : [report]} />
    </Screen>
  );
}
