import { useCallback } from 'react';
import { useRouter, type Href } from 'expo-router';
import type { Reading } from '@/shared/contracts/residues';
import { residuePath } from '@/client/paths';

/** Opens what a reading means; a typed change goes along and is offered there. */
export function useOpenReading(
  projectId: string,
  way: 'push' | 'replace' = 'push',
): (reading: Reading) => void {
  const router = useRouter();
  return useCallback(
    ({ residue, mutationTo }) => router[way](residuePath(projectId, residue, mutationTo) as Href),
    [router, way, projectId],
  );
}
