import { router } from 'expo-router';
import { z } from 'zod';
import { Panes, Screen } from '@/components/layout';
import { NothingHere, ReadView } from '@/components/ui';
import { planPath } from '@/client/paths';
import { useRouteParams } from '@/client/use-route-params';
import { useProtein } from '@/features/families';
import type { Construct, Mutant } from '@/shared/contracts/plans';
import { leadingDesign } from '../check-words';
import { baseRange } from '../codon-rows';
import { AlternativesPane } from '../components/alternatives-pane';
import { DesignPane } from '../components/design-pane';
import { MutantPane } from '../components/list-pane';
import { MutantActions } from '../components/mutant-actions';
import { concentrationWords, geneticCodeWords } from '../condition-words';
import { useMutantActs } from '../use-mutant-acts';
import { useConstructs, useMutant, useMutants } from '../use-plans';

const params = z.object({
  projectId: z.uuid(),
  mutantId: z.uuid(),
  /** Rank of the design that is shown. */
  design: z.coerce.number().int().min(1).optional(),
});
type Given = z.output<typeof params>;

export function MutantScreen() {
  const given = useRouteParams(params);
  if (!given) return <NothingHere />;
  return <ReadMutant key={given.mutantId} {...given} />;
}

function ReadMutant(given: Given) {
  const mutant = useMutant(given.projectId, given.mutantId);
  if (!mutant.data) {
    return (
      <Screen title="Plan" backHref={planPath(given.projectId)}>
        <ReadView of={mutant} what="the mutant">
          {() => null}
        </ReadView>
      </Screen>
    );
  }
  return <OpenMutant {...given} mutant={mutant.data} />;
}

function OpenMutant({ projectId, mutantId, mutant, design: rank }: Given & { mutant: Mutant }) {
  const mutants = useMutants(projectId).data;
  const constructs = useConstructs(projectId).data;
  const acts = useMutantActs(projectId, mutant);
  const construct = constructs?.find(({ id }) => id === mutant.constructId);
  const residue = mutant.mutations[0]?.residue;
  const protein = useProtein(projectId, residue?.proteinId ?? null).data;
  const design = mutant.designs.find((one) => one.rank === rank) ?? leadingDesign(mutant.designs);
  const show = ({ rank: shown }: { rank: number }) => router.setParams({ design: String(shown) });
  const actions = { projectId, design, isChoosing: acts.isChoosing, onChoose: acts.choose };
  return (
    <Screen
      title={`Plan ${residue?.family ?? ''} ${mutant.name}`}
      backHref={planPath(projectId)}
      kind="panes"
      items={titleItems(mutant, construct, design?.codons ?? [])}
      actions={design ? <MutantActions {...actions} isBar /> : undefined}
    >
      <Panes
        name="mutant"
        panes={[
          {
            key: 'mutants',
            label: 'Mutations',
            widthPixels: 320,
            hideWhenStacked: true,
            content: (
              <div className="no-print">
                <MutantPane projectId={projectId} mutants={mutants ?? [mutant]} currentId={mutantId} />
              </div>
            ),
          },
          {
            key: 'design',
            label: 'Design',
            content: (
              <DesignPane
                {...{ projectId, mutant, design, construct, protein }}
                constructsRead={!!constructs}
              />
            ),
          },
          {
            key: 'alternatives',
            label: 'Alternatives and next step',
            widthPixels: 330,
            content: (
              <AlternativesPane
                {...{ projectId, mutant, design, acts }}
                constructs={constructs ?? []}
                onShow={show}
              />
            ),
          },
        ]}
      />
    </Screen>
  );
}

function titleItems(
  mutant: Mutant,
  construct: Construct | undefined,
  codons: Mutant['designs'][number]['codons'],
) {
  const numbering = mutant.mutations[0]?.residue.numbering ?? '';
  if (!construct) {
    return [
      { key: 'numbering', label: 'Numbering', value: numbering },
      { key: 'construct', label: 'Construct', value: mutant.constructName ?? 'none yet' },
    ];
  }
  const size = construct.bases.length;
  return [
    { key: 'numbering', label: 'Numbering', value: numbering },
    { key: 'construct', label: 'Construct', value: `${construct.name}, ${size} bp` },
    { key: 'code', label: 'Code', value: geneticCodeWords(construct.geneticCode) },
    ...codons.map(({ residue, codonStart }) => ({
      key: `codon-${codonStart}`,
      label: `Codon ${residue.label}`,
      value: `bases ${baseRange(codonStart, 3, size)}`,
    })),
    { key: 'conditions', label: 'Conditions', value: concentrationWords() },
  ];
}
