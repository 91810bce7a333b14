import type { Passport } from '@/shared/contracts/residues';
import { ShareBars } from '@/components/residue';
import { Caption, Empty, Text } from '@/components/ui';
import { letterShares } from '../column-rows';

/** What the other rows of the family's alignment carry in this residue's column. */
export function CarriedSection({ passport: { residue, column } }: { passport: Passport }) {
  if (!column)
    return (
      <section aria-label="What the other rows carry">
        <Caption>What the other rows carry</Caption>
        <Empty title="In no row of an alignment">
          {`An alignment of family ${residue.family} with a row of this protein fills it, and shows its equivalents.`}
        </Empty>
      </section>
    );
  const { shares, rowCount } = letterShares(column);
  const twice = column.rowCount - rowCount;
  return (
    <section aria-label="What the other rows carry">
      <Caption count={`from ${rowCount} rows`}>What the other rows carry</Caption>
      <ShareBars
        shares={shares}
        own={residue.letter}
        label={`Letters in column ${column.column + 1} of ${column.alignmentName}, revision ${column.revision}`}
      />
      {twice > 0 ? (
        <Text kind="meta" tone="soft">
          {`${column.rowCount} rows in all; each protein counts once.`}
        </Text>
      ) : null}
    </section>
  );
}
