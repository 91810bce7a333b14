import type { Upload } from '@/shared/contracts/uploads';
import { useAlignments } from '@/features/alignments';
import { useFamilies } from '@/features/families';
import { useMembers } from '@/features/projects';
import { useStructures } from '@/features/structures';
import { useUploads } from '@/features/uploads';

const mostRefused = 3;

/** Files on their way, and the last ones that were refused: what still asks for somebody's eye. */
export function openUploads(uploads: readonly Upload[]): Upload[] {
  const refused = uploads.filter(({ state }) => state === 'refused').slice(0, mostRefused);
  return uploads.filter(
    (upload) => refused.includes(upload) || (upload.state !== 'refused' && upload.state !== 'done'),
  );
}

/** What a project holds, as the Find place shows it. */
export function useHoldings(projectId: string) {
  const families = useFamilies(projectId);
  const alignments = useAlignments(projectId);
  const structures = useStructures(projectId);
  const uploads = useUploads(projectId);
  const members = useMembers(projectId);
  const parts = [families, alignments, structures, uploads, members];
  const error = parts.find((part) => part.data === undefined && part.error)?.error ?? null;
  const data =
    families.data && alignments.data && structures.data && uploads.data && members.data
      ? {
          families: families.data,
          alignments: alignments.data,
          structures: structures.data,
          uploads: openUploads(uploads.data),
          members: members.data,
        }
      : undefined;
  return { data, error, refetch: () => Promise.all(parts.map((part) => part.refetch())) };
}

export type Holdings = NonNullable<ReturnType<typeof useHoldings>['data']>;
