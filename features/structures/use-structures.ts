import { useQuery } from '@tanstack/react-query';
import { structures, type Structure, type StructureWithChains } from '@/shared/contracts/structures';
import { call } from '@/client/api';
import { liveQuery } from '@/client/live-query';
import { applyToStructure, applyToStructures } from './apply-structure-event';

const key = (projectId: string, ...rest: string[]) => ['project', projectId, 'structures', ...rest];

export const structuresQuery = (projectId: string) =>
  liveQuery<Structure[]>({
    projectId,
    queryKey: key(projectId),
    read: (signal) => call(structures.list, { params: { projectId }, signal }),
    apply: applyToStructures,
  });

export const structureQuery = (projectId: string, structureId: string) =>
  liveQuery<StructureWithChains>({
    projectId,
    queryKey: key(projectId, structureId),
    read: (signal) => call(structures.read, { params: { projectId, structureId }, signal }),
    apply: applyToStructure,
  });

export function useStructures(projectId: string) {
  return useQuery(structuresQuery(projectId));
}

/** A structure with its chains and their maps; asks nothing while none is chosen. */
export function useStructure(projectId: string, structureId: string | null) {
  return useQuery({ ...structureQuery(projectId, structureId ?? ''), enabled: structureId !== null });
}
