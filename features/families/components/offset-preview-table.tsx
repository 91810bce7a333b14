import type { Protein } from '@/shared/contracts/families';
import { wordsForCode } from '@/components/residue';
import { Table } from '@/components/ui';
import { previewOffset } from '../offset-preview';

interface OffsetPreviewProps {
  protein: Protein;
  rule: { offset: number; skipZero: boolean };
  askedPlace: number | null;
  name: string;
}

/** What the new numbers would be, before anything is saved. */
export function OffsetPreviewTable({ protein, rule, askedPlace, name }: OffsetPreviewProps) {
  return (
    <Table
      caption="What it does"
      rows={previewOffset(protein.residues, rule, askedPlace)}
      keyOf={({ what }) => what}
      columns={[
        { key: 'what', header: 'residue', rowHeader: true, cell: ({ what }) => what },
        { key: 'place', header: 'in the sequence', numeric: true, cell: ({ place }) => place },
        {
          key: 'label',
          header: name || 'new name',
          numeric: true,
          cell: ({ letter, label }) => <b>{`${wordsForCode(letter).threeLetter} ${label}`}</b>,
        },
      ]}
    />
  );
}
