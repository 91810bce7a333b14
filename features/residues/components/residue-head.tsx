import { useEffect } from 'react';
import { useQueryClient } from '@tanstack/react-query';
import ChevronLeft from 'lucide-react-native/icons/chevron-left';
import ChevronRight from 'lucide-react-native/icons/chevron-right';
import type { ResidueLabel } from '@/shared/contracts/common';
import type { Passport } from '@/shared/contracts/residues';
import { BigPlate, ChainScale, plateWords, spokenResidue } from '@/components/residue';
import { IconButton, Row, Stack } from '@/components/ui';
import { residuePath } from '@/client/paths';
import { passportQuery } from '../use-residues';
import { useScaleLabels } from '../use-scale-labels';

const nameOf = ({ family, letter, label }: ResidueLabel): string =>
  spokenResidue({ family, code: letter, number: label });

interface StepProps {
  projectId: string;
  to: ResidueLabel | null;
  word: 'Previous' | 'Next';
}

function Step({ projectId, to, word }: StepProps) {
  const icon = word === 'Previous' ? ChevronLeft : ChevronRight;
  if (!to) return <span style={{ width: 'var(--hit)', flex: 'none' }} />;
  return (
    <IconButton icon={icon} label={`${word} residue: ${nameOf(to)}`} href={residuePath(projectId, to)} />
  );
}

/** The residue at arm's length, its place on the chain, and the way to its neighbours. */
export function ResidueHead({ projectId, passport }: { projectId: string; passport: Passport }) {
  const { residue, proteinLength, pinnedIndices, previous, next } = passport;
  const labelAt = useScaleLabels(projectId, residue);
  usePrefetched(projectId, previous, next);
  return (
    <Stack gap={12}>
      <BigPlate {...plateWords(residue)} />
      <Row gap={4} align="start">
        <Step projectId={projectId} to={previous} word="Previous" />
        <div style={{ flex: 1, minWidth: 0 }}>
          <ChainScale
            part={residue.part}
            length={proteinLength}
            current={residue.residueIndex}
            labelAt={labelAt}
            pins={pinnedIndices}
            caption={`${residue.residueIndex + 1} of ${proteinLength} residues, ${residue.numbering} numbering · dots are pinned residues`}
          />
        </div>
        <Step projectId={projectId} to={next} word="Next" />
      </Row>
    </Stack>
  );
}

/** Neighbours are read ahead, so that walking along the chain never waits. */
function usePrefetched(projectId: string, ...neighbours: (ResidueLabel | null)[]): void {
  const client = useQueryClient();
  const [previous, next] = neighbours.map((one) => (one ? `${one.proteinId} ${one.residueIndex}` : ''));
  useEffect(() => {
    for (const one of [previous, next]) {
      const [proteinId, index] = (one ?? '').split(' ');
      if (!proteinId || index === undefined) continue;
      void client.prefetchQuery({ ...passportQuery(projectId, proteinId, Number(index)), staleTime: 30_000 });
    }
  }, [client, projectId, previous, next]);
}
