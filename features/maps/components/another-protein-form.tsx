import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { mapDecisionBody } from '@/shared/contracts/maps';
import type { Family } from '@/shared/contracts/families';
import { BoundSelect, Form, Select } from '@/components/form';
import { Button } from '@/components/ui';
import { familyOptions, useProteins } from '@/features/families';
import type { MapDecision } from '../use-decide-chains';

interface AnotherProteinFormProps {
  projectId: string;
  families: readonly Family[];
  /** The family proposed. */
  familyId: string | null;
  isPrimary: boolean;
  busyText?: string;
  onDecide: (decision: MapDecision) => void;
}

const correction = mapDecisionBody.options[1];

/** Chooses a protein of the project for a chain: the family first, then which of its proteins. */
export function AnotherProteinForm(props: AnotherProteinFormProps) {
  const { projectId, families, isPrimary, busyText, onDecide } = props;
  const [familyId, setFamilyId] = useState(props.familyId ?? '');
  const proteins = useProteins(projectId, familyId || null);
  const { control, handleSubmit, setValue } = useForm<{ decision: 'correct'; proteinId: string }>({
    resolver: zodResolver(correction),
    defaultValues: { decision: 'correct', proteinId: '' },
  });
  const filled = families.filter(({ proteinCount }) => proteinCount > 0);
  return (
    <Form onSubmit={() => void handleSubmit((decision) => onDecide(decision))()} gap={12}>
      <Select
        label="Family"
        placeholder="Choose a family"
        hint={filled.length === 0 ? 'No family has a protein yet: an alignment brings them.' : undefined}
        options={familyOptions(filled)}
        value={familyId}
        onChange={(next) => {
          setFamilyId(next);
          setValue('proteinId', '');
        }}
      />
      <BoundSelect
        control={control}
        name="proteinId"
        label="Protein"
        placeholder={familyId ? 'Choose a protein' : 'Choose the family first'}
        options={(proteins.data ?? []).map(({ id, organism, length }) => ({
          value: id,
          label: `${organism} · ${length} residues`,
        }))}
        wrongWords="Choose the protein this chain is."
        required
      />
      <Button kind={isPrimary ? 'primary' : 'plain'} submit full busyText={busyText}>
        Map to this protein
      </Button>
    </Form>
  );
}
