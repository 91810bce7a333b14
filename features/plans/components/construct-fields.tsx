import { useState } from 'react';
import { Controller, type UseFormReturn } from 'react-hook-form';
import type { z } from 'zod';
import { BoundArea, BoundText, FileDrop, Select, TextInput } from '@/components/form';
import { Segment, Stack, Text } from '@/components/ui';
import type { newConstructBody } from '@/shared/contracts/plans';
import { GENETIC_CODE_IDS } from '@/shared/sequence/construct/genetic-code';
import { DNA_LIMITS } from '@/shared/sequence/construct/read-dna';
import { geneticCodeWords } from '../condition-words';
import { ProteinPicker } from './protein-picker';

export type ConstructValues = z.input<typeof newConstructBody>;

interface ConstructFieldsProps {
  projectId: string;
  form: UseFormReturn<ConstructValues>;
}

const startError = 'Write the number of a base, counted from 1.';

/** What a construct is made from. */
export function ConstructFields({ projectId, form }: ConstructFieldsProps) {
  const { control } = form;
  return (
    <Stack gap={16}>
      <BoundText control={control} name="name" label="Name" hint="As the lab calls it." required />
      <Controller
        control={control}
        name="proteinId"
        render={({ field, fieldState }) => (
          <ProteinPicker
            projectId={projectId}
            value={field.value}
            onChange={field.onChange}
            name={field.name}
            error={fieldState.error && 'Choose the protein it encodes.'}
          />
        )}
      />
      <DnaField form={form} />
      <Controller
        control={control}
        name="codingStart"
        render={({ field, fieldState }) => (
          <TextInput
            label="First base of the coding part"
            hint="Counted from 1, tags included."
            inputMode="numeric"
            mono
            required
            {...field}
            value={Number.isNaN(field.value) ? '' : String(field.value)}
            onChange={(text) => field.onChange(digitsOf(text))}
            error={fieldState.error && (Number.isNaN(field.value) ? startError : fieldState.error.message)}
          />
        )}
      />
      <Controller
        control={control}
        name="circular"
        render={({ field }) => (
          <Stack gap={4}>
            <Text kind="small" strong>
              The DNA is
            </Text>
            <Segment
              label="The DNA is"
              options={[
                { value: 'linear', label: 'a linear piece' },
                { value: 'circular', label: 'the whole circle' },
              ]}
              value={field.value ? 'circular' : 'linear'}
              onChange={(value) => field.onChange(value === 'circular')}
            />
            <Text kind="small" tone="soft">
              A whole plasmid is searched for other places where a primer would bind; a piece only within
              itself.
            </Text>
          </Stack>
        )}
      />
      <Controller
        control={control}
        name="geneticCode"
        render={({ field, fieldState }) => (
          <Select
            label="Genetic code"
            options={GENETIC_CODE_IDS.map((id) => ({ value: String(id), label: geneticCodeWords(id) }))}
            {...field}
            value={String(field.value)}
            onChange={(value) => field.onChange(Number(value))}
            error={fieldState.error?.message}
          />
        )}
      />
    </Stack>
  );
}

/** Empty is no number, and says so when the form is sent. */
function digitsOf(text: string): number {
  const digits = text.replace(/\D/g, '').slice(0, 9);
  return digits === '' ? Number.NaN : Number(digits);
}

function DnaField({ form }: Pick<ConstructFieldsProps, 'form'>) {
  const [fileError, setFileError] = useState<string>();
  const take = async (file: File) => {
    // Titles and line ends take room beside the bases.
    if (file.size > 4 * DNA_LIMITS.maxBases) {
      setFileError(`${file.name} is larger than a construct: at most ${DNA_LIMITS.maxBases} bases.`);
      return;
    }
    setFileError(undefined);
    form.setValue('dna', await file.text(), { shouldDirty: true, shouldValidate: true });
  };
  return (
    <Stack gap={8}>
      <BoundArea
        control={form.control}
        name="dna"
        label="DNA"
        hint="Paste FASTA or plain bases: the whole plasmid if there is one."
        rows={8}
        mono
        required
      />
      <FileDrop
        title="Or read it from a text file"
        hint="FASTA or plain bases. It is read here into the field above and can be changed before it is stored."
        accept=".fa,.fasta,.fna,.seq,.txt"
        buttonKind="plain"
        onFile={(file) => void take(file)}
        error={fileError}
      />
    </Stack>
  );
}
