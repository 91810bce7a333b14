import type { ResidueLabel } from '@/shared/contracts/common';
import { Banner, Button } from '@/components/ui';
import { newMutantPath } from '@/client/paths';
import { useMay } from '@/features/projects';

interface TypedChangeProps {
  projectId: string;
  residue: ResidueLabel;
  becomes: string;
}

/** A mutation was typed into the locator: the residue opened, and the plan is one press away. */
export function TypedChange({ projectId, residue, becomes }: TypedChangeProps) {
  const mayPlan = useMay(projectId)('plan');
  const { letter, label, proteinId, residueIndex } = residue;
  const change = `${letter}${label}${becomes}`;
  if (becomes === letter)
    return <Banner announce={false}>{`${change} was typed: that letter stands here already.`}</Banner>;
  return (
    <Banner
      announce={false}
      action={
        mayPlan ? (
          <Button href={newMutantPath(projectId, { proteinId, residueIndex, changes: change })}>
            {`Plan ${change}`}
          </Button>
        ) : undefined
      }
    >
      {`${change} was typed; this is the residue it changes.`}
      {mayPlan ? '' : ' Contributors plan mutations.'}
    </Banner>
  );
}
