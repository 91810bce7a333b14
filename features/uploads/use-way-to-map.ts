import { useRouter } from 'expo-router';
import { useEffect, useRef } from 'react';
import type { Upload } from '@/shared/contracts/uploads';
import { structurePath } from '@/client/paths';

/** Whoever watches a structure being read goes on to its map as soon as it waits for them. */
export function useWayToMap(projectId: string, upload: Upload | undefined, mayConfirm: boolean): void {
  const router = useRouter();
  const watched = useRef(false);
  const { state, structureId } = upload ?? {};
  useEffect(() => {
    if (state === 'received' || state === 'reading') watched.current = true;
    else if (state === 'waiting' && structureId && watched.current && mayConfirm) {
      watched.current = false;
      router.replace(structurePath(projectId, structureId) as never);
    }
  }, [state, structureId, mayConfirm, projectId, router]);
}
