import { z } from 'zod';
import { annotation, editAnnotationBody, evidence, type Annotation } from '@/shared/contracts/annotations';
import { residueLabel } from '@/shared/contracts/common';

/** What is filled in for a statement; `partner` is the second residue of a pair, at a new pin only. */
export const annotationValues = editAnnotationBody.extend({ partner: residueLabel.nullable() });
export type AnnotationValues = z.infer<typeof annotationValues>;

/** The same half filled in, as a draft keeps it. */
export const annotationDraft: z.ZodType<AnnotationValues> = annotationValues.extend({
  text: z.string(),
  evidence: z.array(evidence.extend({ reference: z.string() })),
});

export const emptyValues: AnnotationValues = {
  kind: 'note',
  text: '',
  confidence: 'medium',
  evidence: [],
  partner: null,
};

export const valuesOf = ({ kind, text, confidence, evidence: list }: Annotation): AnnotationValues => ({
  kind,
  text,
  confidence,
  evidence: list,
  partner: null,
});

export const bodyOf = ({ kind, text, confidence, evidence: list }: AnnotationValues) => ({
  kind,
  text,
  confidence,
  evidence: list,
});

/** A draft of an edit keeps what it was begun on, so that both sides can be shown however late it is sent. */
export const editDraft = z.object({ base: annotation, values: annotationDraft });
export type EditDraft = z.infer<typeof editDraft>;
