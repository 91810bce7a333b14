import { useQuery } from '@tanstack/react-query';
import type { z } from 'zod';
import {
  annotations,
  type Annotation,
  type AnnotationAtResidue,
  type annotationStatusBody,
  type editAnnotationBody,
  type newAnnotationBody,
} from '@/shared/contracts/annotations';
import { call } from '@/client/api';
import type { Fact } from '@/client/facts';
import { liveQuery } from '@/client/live-query';
import { useAct } from '@/client/use-act';
import {
  applyToAnnotationsAtResidue,
  applyToAnnotationVersions,
  type AnnotationVersion,
} from './apply-annotation-event';

const key = (projectId: string, ...rest: (string | number)[]) => [
  'project',
  projectId,
  'annotations',
  ...rest,
];
const tells = (payload: Annotation): Fact[] => [{ kind: 'annotation.changed', payload }];

export const annotationsAtResidueQuery = (projectId: string, proteinId: string, residueIndex: number) =>
  liveQuery<AnnotationAtResidue[]>({
    projectId,
    queryKey: key(projectId, 'at', proteinId, residueIndex),
    read: (signal) => call(annotations.atResidue, { params: { projectId, proteinId, residueIndex }, signal }),
    apply: (list, fact) => applyToAnnotationsAtResidue(list, fact, { proteinId, residueIndex }),
  });

export const annotationVersionsQuery = (projectId: string, annotationId: string) =>
  liveQuery<AnnotationVersion[]>({
    projectId,
    queryKey: key(projectId, annotationId, 'versions'),
    read: (signal) => call(annotations.versions, { params: { projectId, annotationId }, signal }),
    apply: (list, fact) => applyToAnnotationVersions(list, fact, annotationId),
  });

export function useAnnotationsAtResidue(projectId: string, proteinId: string, residueIndex: number) {
  return useQuery(annotationsAtResidueQuery(projectId, proteinId, residueIndex));
}

/** Earlier texts, newest first; asks nothing while none is looked at. */
export function useAnnotationVersions(projectId: string, annotationId: string | null) {
  return useQuery({
    ...annotationVersionsQuery(projectId, annotationId ?? ''),
    enabled: annotationId !== null,
  });
}

export function useMakeAnnotation(projectId: string) {
  return useAct<z.input<typeof newAnnotationBody>, Annotation>(projectId, {
    send: (body, idempotencyKey) => call(annotations.make, { params: { projectId }, body, idempotencyKey }),
    tells,
  });
}

export function useEditAnnotation(projectId: string) {
  type Given = { annotationId: string; version: number; body: z.input<typeof editAnnotationBody> };
  return useAct<Given, Annotation>(projectId, {
    send: ({ annotationId, version, body }, idempotencyKey) =>
      call(annotations.edit, { params: { projectId, annotationId }, version, body, idempotencyKey }),
    tells,
  });
}

export function useSetAnnotationStatus(projectId: string) {
  type Given = { annotationId: string; version: number; body: z.input<typeof annotationStatusBody> };
  return useAct<Given, Annotation>(projectId, {
    send: ({ annotationId, version, body }, idempotencyKey) =>
      call(annotations.setStatus, { params: { projectId, annotationId }, version, body, idempotencyKey }),
    tells,
  });
}
