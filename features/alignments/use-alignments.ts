import { useQuery } from '@tanstack/react-query';
import { alignments, type Alignment } from '@/shared/contracts/alignments';
import { call } from '@/client/api';
import { liveQuery } from '@/client/live-query';
import { applyToAlignment, applyToAlignments, type AlignmentWithRows } from './apply-alignment-event';

const key = (projectId: string, ...rest: string[]) => ['project', projectId, 'alignments', ...rest];

export const alignmentsQuery = (projectId: string) =>
  liveQuery<Alignment[]>({
    projectId,
    queryKey: key(projectId),
    read: (signal) => call(alignments.list, { params: { projectId }, signal }),
    apply: applyToAlignments,
  });

export const alignmentQuery = (projectId: string, alignmentId: string) =>
  liveQuery<AlignmentWithRows>({
    projectId,
    queryKey: key(projectId, alignmentId),
    read: (signal) => call(alignments.read, { params: { projectId, alignmentId }, signal }),
    apply: applyToAlignment,
  });

export function useAlignments(projectId: string) {
  return useQuery(alignmentsQuery(projectId));
}

/** An alignment with its rows; asks nothing while none is chosen. */
export function useAlignment(projectId: string, alignmentId: string | null) {
  return useQuery({ ...alignmentQuery(projectId, alignmentId ?? ''), enabled: alignmentId !== null });
}
