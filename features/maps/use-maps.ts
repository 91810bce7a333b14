import type { z } from 'zod';
import { maps, type ChainMap, type mapDecisionBody } from '@/shared/contracts/maps';
import { call } from '@/client/api';
import { useAct } from '@/client/use-act';

/** What a curator says of one chain: confirm, correct, add as a protein, leave out. */
export function useDecideMap(projectId: string) {
  type Given = { chainId: string; version: number; body: z.input<typeof mapDecisionBody> };
  return useAct<Given, ChainMap>(projectId, {
    send: ({ chainId, version, body }, idempotencyKey) =>
      call(maps.decide, { params: { projectId, chainId }, version, body, idempotencyKey }),
    tells: (payload) => [{ kind: 'map.decided', payload }],
  });
}

/** Confirms every chain of a structure that can be confirmed as it is. */
export function useConfirmReady(projectId: string) {
  return useAct<{ structureId: string }, ChainMap[]>(projectId, {
    send: ({ structureId }, idempotencyKey) =>
      call(maps.confirmReady, { params: { projectId, structureId }, idempotencyKey }),
    tells: (decided) => decided.map((payload) => ({ kind: 'map.decided', payload })),
  });
}
