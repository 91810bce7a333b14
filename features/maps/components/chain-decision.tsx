import { useState } from 'react';
import type { Family } from '@/shared/contracts/families';
import { Button, Choice, Stack, type ChoiceOption } from '@/components/ui';
import type { ChainGroup } from '../chain-groups';
import type { DecideChains, MapDecision } from '../use-decide-chains';
import { AnotherProteinForm } from './another-protein-form';
import { DecisionProblem } from './decision-problem';
import { NewProteinForm } from './new-protein-form';

interface ChainDecisionProps {
  projectId: string;
  group: ChainGroup;
  families: readonly Family[];
  deciding: DecideChains;
  /** The one main button of the view is here. */
  isPrimary: boolean;
}

type Answer = 'confirm' | 'correct' | 'add protein' | 'leave out';

/** Below this identity a chain may be a protein of its own [common practice, no source; handbook 5.7]. */
const certainIdentity = 0.95;

/** What a curator can say of chains that are alike; what is decided can be decided again. */
export function ChainDecision({ projectId, group, families, deciding, isPrimary }: ChainDecisionProps) {
  const { first, chains, names, standing } = group;
  const [answer, setAnswer] = useState<Answer | undefined>(() => firstAnswer(group));
  const several = chains.length > 1;
  const isAbout = chains.some(({ chainId }) => deciding.about.includes(chainId));
  const who = `${several ? 'chains' : 'chain'} ${names}`;
  const family = families.find(({ id }) => id === first.familyId)?.name ?? '';
  const { progress } = deciding;
  const busyText = progress ? `Deciding ${progress.done + 1} of ${progress.total}` : undefined;
  const decide = (decision: MapDecision) => deciding.decide(chains, decision);
  const options: (ChoiceOption & { value: Answer })[] = [];
  if (first.proteinId !== null && standing !== 'decided')
    options.push({
      value: 'confirm',
      title: `It is ${family} of ${first.organism ?? 'this organism'}`,
      consequence: 'Mapped as shown; exceptions stay marked on their residues.',
    });
  options.push({
    value: 'correct',
    title: standing === 'choose' ? 'A protein of the project' : 'Another protein',
    consequence: 'Choose it; the chain is then aligned with it.',
  });
  if ((first.candidates[0]?.identity ?? 0) < certainIdentity)
    options.push({
      value: 'add protein',
      title: 'A new protein',
      consequence: `The sequence of ${several ? `chain ${first.authorId}` : 'this chain'} becomes a protein of a family.`,
    });
  if (standing !== 'left out')
    options.push({
      value: 'leave out',
      title: 'Leave out',
      consequence: `Residues of ${several ? 'these chains' : 'this chain'} are found under no protein. It can be taken up again.`,
    });
  const chosen = options.find(({ value }) => value === answer)?.value;
  const button = { kind: isPrimary ? 'primary' : 'plain', full: true, busyText } as const;
  const form = { families, familyId: first.familyId, isPrimary, busyText, onDecide: decide };
  return (
    <Stack gap={12}>
      <Choice
        label={`What ${who} ${several ? 'are' : 'is'}`}
        options={options}
        value={chosen}
        onChange={(value) => setAnswer(value as Answer)}
      />
      {isAbout ? <DecisionProblem problem={deciding.problem} conflict={deciding.conflict} /> : null}
      {chosen === 'confirm' ? (
        <Button {...button} onPress={() => decide({ decision: 'confirm' })}>{`Confirm ${names}`}</Button>
      ) : null}
      {chosen === 'correct' ? <AnotherProteinForm projectId={projectId} {...form} /> : null}
      {chosen === 'add protein' ? <NewProteinForm {...form} /> : null}
      {chosen === 'leave out' ? (
        <Button {...button} onPress={() => decide({ decision: 'leave out' })}>{`Leave ${names} out`}</Button>
      ) : null}
    </Stack>
  );
}

/** What is proposed is offered first; nothing is chosen beforehand where a person must choose or has decided. */
const firstAnswer = ({ standing, first }: ChainGroup): Answer | undefined =>
  first.proteinId !== null && (standing === 'ready' || standing === 'look') ? 'confirm' : undefined;
