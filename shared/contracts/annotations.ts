import { z } from 'zod';
import type { Act } from '../permissions';
import { id, indexFromZero, moment, personBrief, projectParams, residueLabel, version } from './common';
import { endpoint } from './endpoint';
import { grade } from './residues';

export const annotationKinds = [
  'ion site',
  'facing charge',
  'nucleotide site',
  'contact',
  'hinge or grip',
  'path',
  'modification',
  'caution',
  'note',
] as const;
export const evidenceKinds = [
  'coordinates',
  'density',
  'mutant',
  'cross-link or label',
  'single-molecule rotation',
  'conservation',
  'calculation',
  'publication',
  'other',
] as const;
export const confidences = ['low', 'medium', 'high'] as const;
export const annotationStatuses = ['proposed', 'accepted', 'contested', 'retired'] as const;
export type AnnotationStatus = (typeof annotationStatuses)[number];
/** proposed → accepted or contested → retired; a retired one can be proposed again. Nothing is deleted. */
export const annotationSteps: Record<AnnotationStatus, readonly AnnotationStatus[]> = {
  proposed: ['accepted', 'contested', 'retired'],
  accepted: ['contested', 'retired'],
  contested: ['accepted', 'retired', 'proposed'],
  retired: ['proposed'],
};
/** The right that each step asks for. */
export const actOfAnnotationStatus: Record<AnnotationStatus, Act> = {
  accepted: 'accept annotation',
  contested: 'contest annotation',
  retired: 'retire annotation',
  proposed: 'retire annotation',
};

export const evidence = z.strictObject({
  kind: z.enum(evidenceKinds),
  reference: z.string().trim().max(500, 'At most 500 characters.'),
});
export const annotationText = z
  .string()
  .trim()
  .min(1, 'Write what is known.')
  .max(8000, 'At most 8,000 characters.');

const content = {
  kind: z.enum(annotationKinds),
  text: annotationText,
  confidence: z.enum(confidences),
  evidence: z.array(evidence).max(10),
};

/** Which copies it speaks of; all of them when no structure is named. */
export const pin = residueLabel.extend({
  structureId: id.nullable(),
  chains: z.array(z.string()).nullable(),
});
export const newPin = z.strictObject({
  proteinId: id,
  residueIndex: indexFromZero,
  structureId: id.optional(),
  chains: z.array(z.string().max(8)).max(200).optional(),
});

export const annotation = z.object({
  id,
  shape: z.enum(['point', 'pair', 'path', 'set']),
  status: z.enum(annotationStatuses),
  statusReason: z.string(),
  ...content,
  pins: z.array(pin),
  versionNumber: z.int(),
  by: personBrief,
  at: moment,
  changedBy: personBrief,
  changedAt: moment,
  version,
});
export type Annotation = z.infer<typeof annotation>;
/** Set when the annotation is not pinned here but on an equivalent residue. */
export const annotationAtResidue = annotation.extend({
  viaEquivalence: z.object({ residue: residueLabel, grade }).nullable(),
});
export type AnnotationAtResidue = z.infer<typeof annotationAtResidue>;

export const annotationVersion = z.object({ number: z.int(), ...content, by: personBrief, at: moment });

export const newAnnotationBody = z.strictObject({ pins: z.array(newPin).min(1).max(50), ...content });
export const editAnnotationBody = z.strictObject(content);
export const annotationStatusBody = z.strictObject({
  status: z.enum(['accepted', 'contested', 'retired', 'proposed']),
  /** Asked for when contesting and retiring. */
  reason: z.string().trim().max(2000),
});
const annotationParams = z.strictObject({ projectId: id, annotationId: id });

export const annotations = {
  list: endpoint({
    name: 'annotations.list',
    method: 'GET',
    path: '/projects/:projectId/annotations',
    params: projectParams,
    query: z.strictObject({
      before: id.optional(),
      limit: z.coerce.number().int().min(1).max(100).default(50),
    }),
    reply: z.object({ annotations: z.array(annotation), next: id.nullable() }),
  }),
  atResidue: endpoint({
    name: 'annotations.atResidue',
    method: 'GET',
    path: '/projects/:projectId/residues/:proteinId/:residueIndex/annotations',
    params: z.strictObject({ projectId: id, proteinId: id, residueIndex: z.coerce.number().int().min(0) }),
    reply: z.array(annotationAtResidue),
  }),
  make: endpoint({
    name: 'annotations.make',
    method: 'POST',
    path: '/projects/:projectId/annotations',
    params: projectParams,
    body: newAnnotationBody,
    reply: annotation,
  }),
  edit: endpoint({
    name: 'annotations.edit',
    method: 'PATCH',
    path: '/projects/:projectId/annotations/:annotationId',
    params: annotationParams,
    versioned: true,
    body: editAnnotationBody,
    reply: annotation,
  }),
  setStatus: endpoint({
    name: 'annotations.setStatus',
    method: 'PUT',
    path: '/projects/:projectId/annotations/:annotationId/status',
    params: annotationParams,
    versioned: true,
    body: annotationStatusBody,
    reply: annotation,
  }),
  versions: endpoint({
    name: 'annotations.versions',
    method: 'GET',
    path: '/projects/:projectId/annotations/:annotationId/versions',
    params: annotationParams,
    reply: z.array(annotationVersion),
  }),
};

export const annotationEvents = { 'annotation.changed': annotation };
