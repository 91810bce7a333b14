import { useState } from 'react';
import type { Family } from '@/shared/contracts/families';
import type { Upload } from '@/shared/contracts/uploads';
import { asApiProblem, type ApiProblem } from '@/client/problem';
import { readSample } from '@/client/sample-file';
import { useMakeUpload } from '@/features/uploads';
import { sample } from './sample.data';

/** The sample, ready to be uploaded as a file of one's own would be; null where the project has no such family. */
export type Sample = NonNullable<ReturnType<typeof useSample>>;

export function useSample(projectId: string, families: readonly Family[], onMade: (made: Upload) => void) {
  const upload = useMakeUpload(projectId);
  const [fetching, setFetching] = useState(false);
  const [fault, setFault] = useState<ApiProblem | null>(null);
  const family = families.find(({ name }) => name === sample.family);
  if (!family) return null;
  const send = async () => {
    setFetching(true);
    setFault(null);
    try {
      const file = await readSample(sample.fileName);
      upload.mutate({ file, fields: { kind: 'alignment', familyId: family.id } }, { onSuccess: onMade });
    } catch (error) {
      setFault(asApiProblem(error));
    } finally {
      setFetching(false);
    }
  };
  return { send, isSending: fetching || upload.isPending, problem: fault ?? upload.error };
}
