import { useMemo, type ReactElement } from 'react';
import { Plate } from '@/components/residue';
import type { Linkify } from '@/components/ui';
import { locatePath } from '@/client/paths';
import { useFamilies } from '@/features/families';
import { cutAtNames, residueNamePattern } from './residue-names';

/**
 * Draws residue names in a text as plates that lead to what they can mean: which organism and numbering the writer meant
 * is asked there, not guessed here.
 */
export function useResidueNames(projectId: string): Linkify<ReactElement> {
  const { data: families } = useFamilies(projectId);
  return useMemo(() => {
    const known = families ?? [];
    const pattern = residueNamePattern(known);
    if (!pattern) return (text) => [text];
    return (text) =>
      cutAtNames(text, known, pattern).map((part, place) => {
        if (typeof part === 'string') return part;
        const { family, letter, label, mutationTo } = part;
        return (
          <Plate
            key={place}
            family={family}
            part={known.find(({ name }) => name === family)?.part ?? 'other'}
            code={letter}
            number={label}
            becomes={mutationTo ?? undefined}
            href={locatePath(projectId, part.text)}
          />
        );
      });
  }, [families, projectId]);
}
