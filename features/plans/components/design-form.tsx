import { useState } from 'react';
import { Button, Stack, Text } from '@/components/ui';
import type { Construct, Mutant } from '@/shared/contracts/plans';
import type { Host } from '@/shared/sequence/construct/codon-choice';
import { ConstructSelect } from './construct-select';
import { HostSelect } from './host-select';

export interface DesignRequest {
  constructId: string;
  host: Host;
}

interface DesignFormProps {
  projectId: string;
  mutant: Mutant;
  constructs: readonly Construct[];
  busy: boolean;
  onDesign: (request: DesignRequest) => void;
}

/** In which DNA and for which host primers are worked out. */
export function DesignForm({ projectId, mutant, constructs, busy, onDesign }: DesignFormProps) {
  const proteinId = mutant.mutations[0]?.residue.proteinId ?? '';
  const only = constructs.filter((construct) => construct.proteinId === proteinId);
  const [constructId, setConstructId] = useState(
    mutant.constructId ?? (only.length === 1 ? (only[0]?.id ?? '') : ''),
  );
  const [host, setHost] = useState<Host>('ecoli');
  const again = mutant.designs.length > 0;
  return (
    <Stack gap={12}>
      <ConstructSelect
        projectId={projectId}
        proteinId={proteinId}
        constructs={constructs}
        value={constructId}
        onChange={setConstructId}
      />
      <HostSelect value={host} onChange={setHost} />
      {again ? (
        <Text tone="soft">The designs above give way to the new ones, the chosen one too.</Text>
      ) : null}
      <Button
        kind={again ? 'plain' : 'primary'}
        full
        busyText={busy ? 'Designing primers' : undefined}
        offReason={constructId ? undefined : 'Choose a construct to design primers'}
        onPress={() => onDesign({ constructId, host })}
      >
        {again ? 'Design again' : 'Design primers'}
      </Button>
    </Stack>
  );
}
