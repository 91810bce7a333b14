import { Controller, useWatch, type UseFormReturn } from 'react-hook-form';
import type { z } from 'zod';
import { BoundArea, BoundText } from '@/components/form';
import { Stack } from '@/components/ui';
import { useFamilies, useProtein } from '@/features/families';
import type { newMutantBody } from '@/shared/contracts/plans';
import type { Host } from '@/shared/sequence/construct/codon-choice';
import { errorsOf, viewChange } from '../change-view';
import { useConstructs } from '../use-plans';
import { useSettled } from '../use-settled';
import { ChangeCheck } from './change-check';
import { ConstructSelect } from './construct-select';
import { HostSelect } from './host-select';
import { ProteinPicker } from './protein-picker';

export type MutantValues = z.input<typeof newMutantBody>;

interface MutantFieldsProps {
  projectId: string;
  form: UseFormReturn<MutantValues>;
  host: Host;
  onHost: (host: Host) => void;
}

/** What is to be changed, in which DNA, and why. */
export function MutantFields({ projectId, form, host, onHost }: MutantFieldsProps) {
  const { control } = form;
  const { proteinId, changes, constructId } = useWatch({ control });
  const protein = useProtein(projectId, proteinId || null).data;
  const family = useFamilies(projectId).data?.find(({ id }) => id === protein?.familyId);
  const constructs = useConstructs(projectId).data;
  const typed = useSettled(changes ?? '');
  const view = protein ? viewChange(typed, protein, family ? [family.name, ...family.aliases] : []) : null;
  const wrong = view ? errorsOf(view) : '';
  const numbering = protein
    ? `Labels in the ${protein.preferredNumbering} numbering of ${protein.organism}. Changes made together are joined by +.`
    : 'Choose the protein first: its preferred numbering is named here.';
  return (
    <Stack gap={16}>
      <Controller
        control={control}
        name="proteinId"
        render={({ field, fieldState }) => (
          <ProteinPicker
            projectId={projectId}
            value={field.value}
            onChange={(next) => {
              field.onChange(next);
              form.setValue('constructId', null);
            }}
            error={fieldState.error && 'Choose the protein that is changed.'}
          />
        )}
      />
      <Stack gap={8}>
        <BoundText
          control={control}
          name="changes"
          label="Change"
          hint={numbering}
          placeholder="E62Q"
          mono
          required
          error={wrong}
        />
        {view && protein && family ? (
          <ChangeCheck
            view={view}
            residue={{
              family: family.name,
              part: family.part,
              numbering: protein.preferredNumbering,
              organism: protein.organism,
            }}
            onTake={(change) => form.setValue('changes', change, { shouldDirty: true, shouldValidate: true })}
          />
        ) : null}
      </Stack>
      <Controller
        control={control}
        name="constructId"
        render={({ field, fieldState }) => (
          <ConstructSelect
            projectId={projectId}
            proteinId={proteinId ?? ''}
            constructs={constructs}
            value={field.value ?? ''}
            onChange={(next) => field.onChange(next || null)}
            error={fieldState.error?.message}
            noneAllowed
          />
        )}
      />
      {constructId ? <HostSelect value={host} onChange={onHost} /> : null}
      <BoundArea
        control={control}
        name="reason"
        label="What it is for"
        hint="Why this change; it stands with the mutant."
        rows={3}
      />
    </Stack>
  );
}
