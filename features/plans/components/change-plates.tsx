import { Plate, plateWords } from '@/components/residue';
import { Row } from '@/components/ui';
import type { Mutant } from '@/shared/contracts/plans';

type Mutation = Mutant['mutations'][number];

const keyOf = ({ residue }: Mutation) => `${residue.proteinId}:${residue.residueIndex}`;

/** `c E62Q`, one plate for each change of a mutant. */
export function ChangePlates({ mutations, size }: { mutations: readonly Mutation[]; size?: 22 | 32 }) {
  return (
    <Row wrap gap={4}>
      {mutations.map((mutation) => (
        <Plate
          key={keyOf(mutation)}
          {...plateWords(mutation.residue)}
          becomes={mutation.newResidues}
          size={size ?? 32}
        />
      ))}
    </Row>
  );
}
