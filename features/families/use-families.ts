import { useQuery } from '@tanstack/react-query';
import type { z } from 'zod';
import {
  families,
  type Family,
  type newFamilyBody,
  type offsetNumberingBody,
  type Protein,
  type ProteinBrief,
} from '@/shared/contracts/families';
import { call } from '@/client/api';
import { liveQuery } from '@/client/live-query';
import { useAct } from '@/client/use-act';
import { applyToFamilies, applyToProtein, applyToProteins } from './apply-family-event';

const key = (projectId: string, ...rest: string[]) => ['project', projectId, 'families', ...rest];

export const familiesQuery = (projectId: string) =>
  liveQuery<Family[]>({
    projectId,
    queryKey: key(projectId),
    read: (signal) => call(families.list, { params: { projectId }, signal }),
    apply: applyToFamilies,
  });

export const proteinsQuery = (projectId: string, familyId: string) =>
  liveQuery<ProteinBrief[]>({
    projectId,
    queryKey: key(projectId, 'proteins of', familyId),
    read: (signal) => call(families.proteins, { params: { projectId, familyId }, signal }),
    apply: (list, fact) => applyToProteins(list, fact, familyId),
  });

export const proteinQuery = (projectId: string, proteinId: string) =>
  liveQuery<Protein>({
    projectId,
    queryKey: key(projectId, 'protein', proteinId),
    read: (signal) => call(families.protein, { params: { projectId, proteinId }, signal }),
    apply: applyToProtein,
  });

export function useFamilies(projectId: string) {
  return useQuery(familiesQuery(projectId));
}

/** The proteins of a family; asks nothing while no family is chosen. */
export function useProteins(projectId: string, familyId: string | null) {
  return useQuery({ ...proteinsQuery(projectId, familyId ?? ''), enabled: familyId !== null });
}

export function useProtein(projectId: string, proteinId: string | null) {
  return useQuery({ ...proteinQuery(projectId, proteinId ?? ''), enabled: proteinId !== null });
}

export function useMakeFamily(projectId: string) {
  return useAct<z.input<typeof newFamilyBody>, Family>(projectId, {
    send: (body, idempotencyKey) => call(families.make, { params: { projectId }, body, idempotencyKey }),
    tells: (payload) => [{ kind: 'family.changed', payload }],
  });
}

export function useRenameProtein(projectId: string) {
  return useAct<{ proteinId: string; version: number; organism: string }, Protein>(projectId, {
    send: ({ proteinId, version, organism }, idempotencyKey) =>
      call(families.renameProtein, {
        params: { projectId, proteinId },
        version,
        body: { organism },
        idempotencyKey,
      }),
    tells: (payload) => [{ kind: 'protein.changed', payload }],
  });
}

export function useSetOffsetNumbering(projectId: string) {
  type Given = { proteinId: string; version: number; body: z.input<typeof offsetNumberingBody> };
  return useAct<Given, Protein>(projectId, {
    send: ({ proteinId, version, body }, idempotencyKey) =>
      call(families.setOffsetNumbering, { params: { projectId, proteinId }, version, body, idempotencyKey }),
    tells: (payload) => [{ kind: 'protein.changed', payload }],
  });
}
