import { Controller, type Control } from 'react-hook-form';
import { annotationKinds, confidences } from '@/shared/contracts/annotations';
import { Select, TextArea } from '@/components/form';
import { Segment, Stack, Text } from '@/components/ui';
import type { AnnotationValues } from '../annotation-values';
import { EvidenceFields } from './evidence-fields';

const kinds = annotationKinds.map((kind) => ({ value: kind, label: kind }));
const sureness = confidences.map((confidence) => ({ value: confidence, label: confidence }));

/** What a statement says: its kind, its text, what supports it and how sure it is. */
export function AnnotationFields({ control }: { control: Control<AnnotationValues> }) {
  return (
    <>
      <Controller
        control={control}
        name="kind"
        render={({ field, fieldState }) => (
          <Select label="Kind" options={kinds} {...field} error={fieldState.error?.message} />
        )}
      />
      <Controller
        control={control}
        name="text"
        render={({ field, fieldState }) => (
          <TextArea
            label="What is known"
            hint="Markdown; residue names such as cE59 become links."
            rows={4}
            required
            {...field}
            error={fieldState.error?.message}
          />
        )}
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
