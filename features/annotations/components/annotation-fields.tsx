import { Controller, type Control } from 'react-hook-form';
import { annotationKinds, confidences } from '@/shared/contracts/annotations';
import { BoundArea, BoundSelect } from '@/components/form';
import { Segment, Stack, Text } from '@/components/ui';
import type { AnnotationValues } from '../annotation-values';
import { EvidenceFields } from './evidence-fields';

const kinds = annotationKinds.map((kind) => ({ value: kind, label: kind }));
const sureness = confidences.map((confidence) => ({ value: confidence, label: confidence }));

/** What a statement says: its kind, its text, what supports it and how sure it is. */
export function AnnotationFields({ control }: { control: Control<AnnotationValues> }) {
  return (
    <>
      <BoundSelect control={control} name="kind" label="Kind" options={kinds} />
      <BoundArea
        control={control}
        name="text"
        label="What is known"
        hint="Markdown; residue names such as cE59 become links."
        rows={4}
        required
      />
      <EvidenceFields control={control} />
      <Controller
        control={control}
        name="confidence"
        render={({ field }) => (
          <Stack gap={4}>
            <Text kind="small" strong>
              Confidence
            </Text>
            <Segment label="Confidence" options={sureness} value={field.value} onChange={field.onChange} />
          </Stack>
        )}
      />
    </>
  );
}
