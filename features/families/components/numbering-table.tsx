import type { Numbering, Protein } from '@/shared/contracts/families';
import { Button, Mark, Table } from '@/components/ui';
import { labelRange } from '../offset-preview';

const kindWords: Record<Numbering['kind'], string> = {
  sequence: 'place in the sequence',
  offset: 'by an offset',
  reference: 'as in a reference',
  author: 'author numbers of a file',
  construct: 'of a construct',
  table: 'from a table',
};

interface NumberingTableProps {
  protein: Protein;
  /** Offers to change a numbering that an offset made. */
  onChange?: (numbering: Numbering) => void;
}

export function NumberingTable({ protein, onChange }: NumberingTableProps) {
  return (
    <Table
      caption="Numberings of this protein"
      rows={protein.numberings}
      keyOf={({ id }) => id}
      columns={[
        {
          key: 'name',
          header: 'name',
          rowHeader: true,
          cell: ({ name }) => (
            <>
              <b>{name}</b>{' '}
              {name === protein.preferredNumbering ? <Mark tone="accent">preferred</Mark> : null}
            </>
          ),
        },
        { key: 'kind', header: 'kind', cell: ({ kind }) => kindWords[kind] },
        {
          key: 'range',
          header: 'first to last',
          numeric: true,
          cell: (numbering) => {
            const { first, last } = labelRange(numbering, protein.length);
            return `${first} to ${last}`;
          },
        },
        ...(onChange
          ? [
              {
                key: 'change',
                header: 'change',
                cell: (numbering: Numbering) =>
                  numbering.kind === 'offset' ? (
                    <Button
                      kind="quiet"
                      label={`Change ${numbering.name}`}
                      onPress={() => onChange(numbering)}
                    >
                      Change
                    </Button>
                  ) : null,
              },
            ]
          : []),
      ]}
    />
  );
}
