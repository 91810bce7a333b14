import { useState } from 'react';
import { useRouter } from 'expo-router';
import type { Protein } from '@/shared/contracts/families';
import { TextInput } from '@/components/form';
import { Button } from '@/components/ui';
import { residuePath } from '@/client/paths';
import { placeOfLabel, preferredOf, labelRange } from '../offset-preview';

interface GoToResidueProps {
  projectId: string;
  protein: Protein;
  /** Where nothing else on the page is the main thing to do. */
  isMain: boolean;
}

/** Opens a residue by its number: the full-size way where the letters are small. */
export function GoToResidue({ projectId, protein, isMain }: GoToResidueProps) {
  const router = useRouter();
  const [text, setText] = useState('');
  const [error, setError] = useState<string>();
  const numbering = preferredOf(protein);
  if (!numbering) return null;
  const go = () => {
    const residueIndex = placeOfLabel(numbering, text.trim());
    if (residueIndex !== null)
      return router.push(residuePath(projectId, { proteinId: protein.id, residueIndex }) as never);
    const { first, last } = labelRange(numbering, protein.length);
    setError(`No residue is called ${text.trim() || 'that'} here. Write a number from ${first} to ${last}.`);
  };
  return (
    <form
      onSubmit={(event) => {
        event.preventDefault();
        go();
      }}
      style={{ display: 'flex', gap: 8, alignItems: 'flex-start', maxWidth: 420 }}
    >
      <div style={{ flex: 1, minWidth: 0 }}>
        <TextInput
          label={`Go to residue number, ${numbering.name} numbering`}
          mono
          value={text}
          onChange={(next) => {
            setText(next);
            setError(undefined);
          }}
          error={error}
        />
      </div>
      <div style={{ paddingTop: 24 }}>
        <Button submit kind={isMain ? 'primary' : 'plain'}>
          Go
        </Button>
      </div>
    </form>
  );
}
