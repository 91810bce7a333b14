import { Empty, Loading, Stack } from '@/components/ui';
import type { Construct, Design, Mutant } from '@/shared/contracts/plans';
import type { LabelledProtein } from '../codon-rows';
import { DesignChecks } from './design-checks';
import { MutantHeading } from './mutant-heading';
import { PrimerTable } from './primer-table';
import { PrimersOnTemplate } from './primers-on-template';

interface DesignPaneProps {
  projectId: string;
  mutant: Mutant;
  design: Design | undefined;
  construct: Construct | undefined;
  constructsRead: boolean;
  protein: LabelledProtein | undefined;
}

/** One design of a mutant: what changes, where the primers lie, what they are, what was checked. */
export function DesignPane(props: DesignPaneProps) {
  const { projectId, mutant, design, construct, constructsRead, protein } = props;
  const part = mutant.mutations[0]?.residue.part ?? 'other';
  return (
    <Stack gap={20}>
      <MutantHeading projectId={projectId} mutant={mutant} design={design} />
      {!design ? (
        <Empty title="No primers yet">
          {mutant.constructId === null
            ? 'The change is planned without DNA. A construct that encodes this protein is needed to design primers.'
            : 'Designing works out the new codon and both primers, and reads the product back.'}
        </Empty>
      ) : !constructsRead ? (
        <Loading>Reading the construct</Loading>
      ) : construct ? (
        <PrimersOnTemplate construct={construct} protein={protein} design={design} part={part} />
      ) : null}
      {design ? (
        <>
          <PrimerTable design={design} />
          <DesignChecks design={design} mutant={mutant} />
        </>
      ) : null}
    </Stack>
  );
}
