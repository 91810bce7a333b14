import PencilRuler from 'lucide-react-native/icons/pencil-ruler';
import type { ResidueLabel } from '@/shared/contracts/common';
import type { Mutant } from '@/shared/contracts/plans';
import { Plate, plateWords } from '@/components/residue';
import { Button, Caption, counted, Empty, List, ListRow, ReadView } from '@/components/ui';
import { mutantPath, newMutantPath } from '@/client/paths';
import { useMutants } from '@/features/plans';
import { useMay } from '@/features/projects';

interface MutantsSectionProps {
  projectId: string;
  residue: ResidueLabel;
}

/** What is planned or made of this residue. */
export function MutantsSection({ projectId, residue }: MutantsSectionProps) {
  const { proteinId, residueIndex } = residue;
  const mutants = useMutants(projectId, { proteinId, residueIndex });
  const mayPlan = useMay(projectId)('plan');
  const href = newMutantPath(projectId, { proteinId, residueIndex });
  const isEmpty = mutants.data?.length === 0;
  return (
    <section aria-label="Planned mutations">
      <Caption
        count={mutants.data?.length}
        action={
          mayPlan && !isEmpty ? (
            <Button kind="quiet" icon={PencilRuler} href={href}>
              Plan a mutation
            </Button>
          ) : undefined
        }
      >
        Mutations
      </Caption>
      <ReadView of={mutants} what="the mutations">
        {(list) =>
          list.length === 0 ? (
            <Empty
              title="No mutation planned here yet"
              action={
                mayPlan ? (
                  <Button icon={PencilRuler} href={href}>
                    Plan a mutation
                  </Button>
                ) : undefined
              }
            >
              Decide one in the thread, or plan it by hand.
            </Empty>
          ) : (
            <List label="Mutations" rows={list} keyOf={({ id }) => id}>
              {(mutant) => <MutantRow projectId={projectId} residue={residue} mutant={mutant} />}
            </List>
          )
        }
      </ReadView>
    </section>
  );
}

function MutantRow({ projectId, residue, mutant }: MutantsSectionProps & { mutant: Mutant }) {
  const here = mutant.mutations.find(
    (one) => one.residue.proteinId === residue.proteinId && one.residue.residueIndex === residue.residueIndex,
  );
  const more = mutant.mutations.length - 1;
  return (
    <ListRow
      href={mutantPath(projectId, mutant.id)}
      lead={<Plate size={32} {...plateWords(residue)} becomes={here?.newResidues} />}
      title={mutant.state}
      detail={[
        mutant.name,
        more > 0 ? `with ${counted(more, 'more change')}` : null,
        mutant.constructName ? `in ${mutant.constructName}` : 'no construct chosen',
      ]
        .filter((words) => words !== null)
        .join(', ')}
    />
  );
}
