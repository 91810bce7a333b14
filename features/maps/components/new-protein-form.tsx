import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { mapDecisionBody } from '@/shared/contracts/maps';
import type { Family } from '@/shared/contracts/families';
import { BoundSelect, BoundText, Form } from '@/components/form';
import { Button } from '@/components/ui';
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
    <Form onSubmit={() => void handleSubmit((decision) => onDecide(decision))()} gap={12}>
      <BoundSelect
        control={control}
        name="familyId"
        label="Family"
        placeholder="Choose a family"
        options={familyOptions(families)}
        wrongWords="Choose the family it belongs to."
        required
      />
      <BoundText
        control={control}
        name="organism"
        label="Organism"
        hint="Whose protein it is; can be changed later."
        required
      />
      <Button kind={isPrimary ? 'primary' : 'plain'} submit full busyText={busyText}>
        Add the protein
      </Button>
    </Form>
  );
}
