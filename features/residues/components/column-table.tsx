import { useState } from 'react';
import ArrowRight from 'lucide-react-native/icons/arrow-right';
import type { Passport } from '@/shared/contracts/residues';
import { Grade, Plate, plateWords } from '@/components/residue';
import { face, usePrinting } from '@/components/theme';
import { Button, Caption, Empty, Stack, Table, Text, type TableColumn } from '@/components/ui';
import { alignmentPath } from '@/client/paths';
import { columnRows, type ColumnRow } from '../column-rows';
import { ResiduePlate } from './residue-plate';

const atFirst = 8;
const relationWords = { same: 'same letter', similar: 'similar letter', other: 'other letter' } as const;

interface ColumnTableProps {
  projectId: string;
  passport: Passport;
  /** Shows all rows at once, where the table has a pane of its own. */
  all?: boolean;
}

function columnsOf(projectId: string, { residue }: Passport): TableColumn<ColumnRow>[] {
  return [
    {
      key: 'residue',
      header: 'residue',
      rowHeader: true,
      cell: (row) => {
        if (row.kind === 'gap') return <span style={{ fontFamily: face.mono }}>gap</span>;
        if (row.kind === 'own') return <Plate {...plateWords(residue)} selected />;
        return (
          <ResiduePlate
            projectId={projectId}
            residue={row.equivalent}
            evidence="equivalence"
            grade={row.equivalent.grade}
          />
        );
      },
    },
    {
      key: 'organism',
      header: 'organism',
      cell: (row) => {
        const other = row.kind === 'equivalent' && row.equivalent.numbering !== residue.numbering;
        return (
          <Stack gap={0}>
            <em>{row.organism}</em>
            {other ? <Text kind="meta" tone="soft">{`${row.equivalent.numbering} numbering`}</Text> : null}
          </Stack>
        );
      },
    },
    {
      key: 'grade',
      header: 'by equivalence',
      cell: (row) => {
        if (row.kind === 'own') return 'this residue';
        if (row.kind === 'gap') return 'no equivalent';
        return (
          <Stack gap={0}>
            <Grade grade={row.equivalent.grade} />
            <Text kind="meta" tone="soft">
              {relationWords[row.equivalent.letterRelation]}
            </Text>
          </Stack>
        );
      },
    },
  ];
}

/** The residue's equivalents: the rows of its column, each with its grade. */
export function ColumnTable({ projectId, passport, all }: ColumnTableProps) {
  const { column, residue, equivalents } = passport;
  const rows = columnRows(passport);
  const [count, setCount] = useState(atFirst + 1);
  const isPrinting = usePrinting();
  const shown = all || isPrinting ? rows : rows.slice(0, count);
  const title = column ? `Column ${column.column + 1} of ${column.alignmentName}` : 'Equivalents';
  return (
    <section aria-label={title}>
      <Caption count={column ? `revision ${column.revision}, ${equivalents.length} equivalents` : undefined}>
        {title}
      </Caption>
      {column ? (
        <Stack gap={4}>
          <Table
            caption={`Rows of ${title}`}
            columns={columnsOf(projectId, passport)}
            rows={shown}
            keyOf={({ key }) => key}
            selectedKey={residue.proteinId}
          />
          {shown.length < rows.length ? (
            <Button kind="quiet" onPress={() => setCount(rows.length)}>
              {`Show ${rows.length - shown.length} more`}
            </Button>
          ) : null}
          <Button kind="quiet" icon={ArrowRight} href={alignmentPath(projectId, column.alignmentId)}>
            Open the alignment
          </Button>
        </Stack>
      ) : (
        <Empty title="No equivalents known">
          {`They come from an alignment of family ${residue.family} in which this protein has a row.`}
        </Empty>
      )}
    </section>
  );
}
