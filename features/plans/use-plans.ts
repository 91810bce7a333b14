import { useQuery } from '@tanstack/react-query';
import type { z } from 'zod';
import {
  plans,
  type Construct,
  type designBody,
  type Mutant,
  type newConstructBody,
  type newMutantBody,
} from '@/shared/contracts/plans';
import { call, downloadText } from '@/client/api';
import type { Fact } from '@/client/facts';
import { liveQuery } from '@/client/live-query';
import { saveFile } from '@/client/save-file';
import { useAct } from '@/client/use-act';
import { applyToConstructs, applyToMutant, applyToMutants, type MutantFilter } from './apply-plan-event';

const key = (projectId: string, ...rest: (string | MutantFilter)[]) => [
  'project',
  projectId,
  'plans',
  ...rest,
];
const tells = (payload: Mutant): Fact[] => [{ kind: 'mutant.changed', payload }];

export const constructsQuery = (projectId: string) =>
  liveQuery<Construct[]>({
    projectId,
    queryKey: key(projectId, 'constructs'),
    read: (signal) => call(plans.constructs, { params: { projectId }, signal }),
    apply: applyToConstructs,
  });

export const mutantsQuery = (projectId: string, filter: MutantFilter = {}) =>
  liveQuery<Mutant[]>({
    projectId,
    queryKey: key(projectId, 'mutants', filter),
    read: (signal) => call(plans.mutants, { params: { projectId }, query: filter, signal }),
    apply: (list, fact) => applyToMutants(list, fact, filter),
  });

export const mutantQuery = (projectId: string, mutantId: string) =>
  liveQuery<Mutant>({
    projectId,
    queryKey: key(projectId, 'mutant', mutantId),
    read: (signal) => call(plans.mutant, { params: { projectId, mutantId }, signal }),
    apply: applyToMutant,
  });

export function useConstructs(projectId: string) {
  return useQuery(constructsQuery(projectId));
}

/** Planned mutants, of a residue or protein if asked, newest first. */
export function useMutants(projectId: string, filter: MutantFilter = {}) {
  return useQuery(mutantsQuery(projectId, filter));
}

export function useMutant(projectId: string, mutantId: string) {
  return useQuery(mutantQuery(projectId, mutantId));
}

export function useMakeConstruct(projectId: string) {
  return useAct<z.input<typeof newConstructBody>, Construct>(projectId, {
    send: (body, idempotencyKey) =>
      call(plans.makeConstruct, { params: { projectId }, body, idempotencyKey }),
    tells: (payload) => [{ kind: 'construct.changed', payload }],
  });
}

export function useMakeMutant(projectId: string) {
  return useAct<z.input<typeof newMutantBody>, Mutant>(projectId, {
    send: (body, idempotencyKey) => call(plans.makeMutant, { params: { projectId }, body, idempotencyKey }),
    tells,
  });
}

/** Works out primer designs for a mutant. */
export function useDesign(projectId: string) {
  type Given = { mutantId: string; version: number; body: z.input<typeof designBody> };
  return useAct<Given, Mutant>(projectId, {
    send: ({ mutantId, version, body }, idempotencyKey) =>
      call(plans.design, { params: { projectId, mutantId }, version, body, idempotencyKey }),
    tells,
  });
}

export function useChooseDesign(projectId: string) {
  type Given = { mutantId: string; version: number; designId: string };
  return useAct<Given, Mutant>(projectId, {
    send: ({ mutantId, version, designId }, idempotencyKey) =>
      call(plans.choose, { params: { projectId, mutantId }, version, body: { designId }, idempotencyKey }),
    tells,
  });
}

/** The chosen primers as CSV, with the caution in it, offered to be saved. */
export async function downloadPrimerList(projectId: string): Promise<string> {
  const { text, fileName } = await downloadText(plans.primerList, { params: { projectId } });
  const savedAs = fileName ?? 'primers.csv';
  saveFile(text, savedAs, 'text/csv;charset=utf-8');
  return savedAs;
}
