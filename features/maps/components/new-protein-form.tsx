import { zodResolver } from '@hookform/resolvers/zod';
import { Controller, useForm } from 'react-hook-form';
import { mapDecisionBody } from '@/shared/contracts/maps';
import type { Family } from '@/shared/contracts/families';
import { Select, TextInput } from '@/components/form';
import { Button, Stack } from '@/components/ui';
import { familyOptions } from '@/features/families';
import type { MapDecision } from '../use-decide-chains';

interface NewProteinFormProps {
  families: readonly Family[];
  /** The family proposed. */
  familyId: string | null;
  isPrimary: boolean;
  busyText?: string;
  onDecide: (decision: MapDecision) => void;
}

const addition = mapDecisionBody.options[2];

/** Makes the sequence of a chain a protein of a family. */
export function NewProteinForm({ families, familyId, isPrimary, busyText, onDecide }: NewProteinFormProps) {
  const { control, handleSubmit } = useForm<{
    decision: 'add protein';
    familyId: string;
    organism: string;
  }>({
    resolver: zodResolver(addition),
    defaultValues: { decision: 'add protein', familyId: familyId ?? '', organism: '' },
  });
  return (
    <form noValidate onSubmit={(event) => void handleSubmit((decision) => onDecide(decision))(event)}>
      <Stack gap={12}>
        <Controller
          control={control}
          name="familyId"
          render={({ field, fieldState }) => (
            <Select
              {...field}
              label="Family"
              placeholder="Choose a family"
              options={familyOptions(families)}
              error={fieldState.error ? 'Choose the family it belongs to.' : undefined}
              required
            />
          )}
        />
        <Controller
          control={control}
          name="organism"
          render={({ field, fieldState }) => (
            <TextInput
              {...field}
              label="Organism"
              hint="Whose protein it is; can be changed later."
              error={fieldState.error?.message}
              required
            />
          )}
        />
        <Button kind={isPrimary ? 'primary' : 'plain'} submit full busyText={busyText}>
          Add the protein
        </Button>
      </Stack>
    </form>
  );
}
