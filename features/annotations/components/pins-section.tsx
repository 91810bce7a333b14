import { useState } from 'react';
import PinIcon from 'lucide-react-native/icons/pin';
import type { AnnotationAtResidue } from '@/shared/contracts/annotations';
import type { ResidueLabel } from '@/shared/contracts/common';
import { Button, Caption, Empty, List, ReadView } from '@/components/ui';
import { useMay } from '@/features/projects';
import { useResidueNames } from '@/features/threads';
import { useAnnotationsAtResidue } from '../use-annotations';
import { PinCard } from './pin-card';

interface PinsSectionProps {
  projectId: string;
  residue: ResidueLabel;
  /** Opens the form for a new one; where it has a place of its own, none is offered here. */
  onPin?: () => void;
}

/** How many hold here and how many come from equivalent residues. */
function countWords(list: readonly AnnotationAtResidue[]): string {
  const kept = list.filter(({ status }) => status !== 'retired');
  const here = kept.filter(({ viaEquivalence }) => viaEquivalence === null).length;
  const via = kept.length - here;
  return via === 0 ? `${here} on this residue` : `${here} on this residue, ${via} by equivalence`;
}

/** The statements that hold at a residue: those pinned here first, then those on its equivalents. */
export function PinsSection({ projectId, residue, onPin }: PinsSectionProps) {
  const pins = useAnnotationsAtResidue(projectId, residue.proteinId, residue.residueIndex);
  const may = useMay(projectId);
  const names = useResidueNames(projectId);
  const [showsRetired, setShowsRetired] = useState(false);
  const mayPin = may('annotate');
  const retired = pins.data?.filter(({ status }) => status === 'retired').length ?? 0;
  return (
    <section aria-label="Pins">
      <Caption
        count={pins.data ? countWords(pins.data) : undefined}
        action={
          onPin && mayPin ? (
            <Button kind="quiet" icon={PinIcon} onPress={onPin}>
              Pin
            </Button>
          ) : undefined
        }
      >
        Pins
      </Caption>
      <ReadView of={pins} what="the pins">
        {(list) => {
          const shown = list.filter(({ status }) => showsRetired || status !== 'retired');
          return (
            <>
              {shown.length === 0 ? (
                <Empty title="No pin here yet">
                  {mayPin
                    ? 'Pin what is known of this residue: what it does, what it faces, what supports it.'
                    : 'Contributors pin what is known of a residue.'}
                </Empty>
              ) : null}
              <List label="Pins" rows={shown} keyOf={({ id }) => id}>
                {(one) => <PinCard projectId={projectId} here={residue} annotation={one} names={names} />}
              </List>
              {retired > 0 ? (
                <Button kind="quiet" onPress={() => setShowsRetired(!showsRetired)}>
                  {showsRetired ? 'Hide what is retired' : `Show ${retired} retired`}
                </Button>
              ) : null}
            </>
          );
        }}
      </ReadView>
    </section>
  );
}
