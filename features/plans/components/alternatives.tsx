import { Caption, List, ListRow, Mark, Stack } from '@/components/ui';
import type { Design } from '@/shared/contracts/plans';
import { linesOfDesign, worstOf } from '../check-words';

interface AlternativesProps {
  designs: readonly Design[];
  shownId: string | undefined;
  onShow: (design: Design) => void;
}

export const codonsOf = (design: Design): string => design.codons.map(({ codonTo }) => codonTo).join(', ');

/** Of the others only what tells them apart: the line of each codon stands in the title already. */
function reasonsShown({ reasons, codons }: Design, isShown: boolean): string[] {
  return isShown ? reasons : reasons.filter((_, place) => place === 0 || place > codons.length);
}

function DesignMark({ design }: { design: Design }) {
  if (!design.proved) return <Mark tone="danger">not proved</Mark>;
  if (design.chosen) return <Mark tone="good">chosen</Mark>;
  const worst = worstOf(linesOfDesign(design));
  if (worst === 'failed') return <Mark tone="danger">failed</Mark>;
  return worst === 'look' ? <Mark tone="warn">look</Mark> : <Mark tone="good">passes</Mark>;
}

/** Designs, best first, each with what speaks for and against it. Pressing one shows it. */
export function Alternatives({ designs, shownId, onShow }: AlternativesProps) {
  return (
    <Stack gap={4}>
      <Caption count={`${designs.length}, ranked`}>Alternatives</Caption>
      <List label="Designs, best first" rows={designs} keyOf={({ id }) => id}>
        {(design) => (
          <ListRow
            title={
              <span style={{ display: 'flex', justifyContent: 'space-between', gap: 8 }}>
                {`${design.rank}. complementary pair, ${codonsOf(design)}`}
                <DesignMark design={design} />
              </span>
            }
            detail={reasonsShown(design, design.id === shownId).map((reason) => (
              <span key={reason} style={{ display: 'block' }}>
                {reason}
              </span>
            ))}
            selected={design.id === shownId}
            onPress={() => onShow(design)}
          />
        )}
      </List>
    </Stack>
  );
}
