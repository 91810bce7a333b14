import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { families, protein as proteinSchema, type Protein } from '@/shared/contracts/families';
import { BoundText, Form } from '@/components/form';
import { Banner, BothTexts, Button, Dialog } from '@/components/ui';
import { showFieldErrors } from '@/client/field-errors';
import { conflictOf } from '@/client/problem';
import { useRenameProtein } from '../use-families';

const body = families.renameProtein.body;
type Name = z.input<typeof body>;

interface RenameProteinProps {
  projectId: string;
  /** As it was when the dialog opened: the name is changed against this version. */
  protein: Protein;
  onClose: () => void;
}

export function RenameProtein({ projectId, protein, onClose }: RenameProteinProps) {
  const rename = useRenameProtein(projectId);
  const { control, handleSubmit, setError, getValues } = useForm<Name>({
    resolver: zodResolver(body),
    defaultValues: { organism: protein.organism },
  });
  const save = (version: number) =>
    void handleSubmit(({ organism }) =>
      rename.mutate(
        { proteinId: protein.id, version, organism },
        {
          onSuccess: onClose,
          onError: (error) => void showFieldErrors(error, ['organism'], setError),
        },
      ),
    )();
  const theirs = conflictOf(rename.error, proteinSchema);
  const busyText = rename.isPending ? 'Saving' : undefined;
  return (
    <Dialog open title="Rename the organism" onClose={onClose}>
      <Form onSubmit={() => save(protein.version)}>
        {rename.error && !theirs ? <Banner kind="danger">{rename.error.message}</Banner> : null}
        <BoundText
          control={control}
          name="organism"
          label="Organism"
          hint="The residues stay as they are; only the name changes, everywhere."
          required
        />
        {theirs ? (
          <BothTexts
            sentence="Somebody changed this protein meanwhile."
            rows={[{ key: 'name', name: 'Organism', theirs: theirs.organism, mine: getValues('organism') }]}
            onTakeTheirs={onClose}
            onKeepMine={() => save(theirs.version)}
            busyText={busyText}
          />
        ) : (
          <div style={{ display: 'flex', flexWrap: 'wrap', gap: 8, justifyContent: 'flex-end' }}>
            <Button onPress={onClose}>Keep the old name</Button>
            <Button kind="primary" submit busyText={busyText}>
              Rename
            </Button>
          </div>
        )}
      </Form>
    </Dialog>
  );
}
