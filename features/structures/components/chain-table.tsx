import { face } from '@/components/theme';
import { Row, Table, type TableColumn } from '@/components/ui';
import { CoverageStrip, mismatchCount, percentWords, StandingMark, type ChainGroup } from '@/features/maps';
import { runnerUpWords } from '../chain-words';
import { FamilyOf, type ChainsProps } from './chain-list';

const orNone = (fraction: number | null): string => (fraction === null ? '' : percentWords(fraction));

/** Chains of a structure as a table, for a wide screen. */
export function ChainTable({ groups, families, openKey, onOpen }: ChainsProps) {
  const columns: TableColumn<ChainGroup>[] = [
    {
      key: 'chain',
      header: 'chain',
      rowHeader: true,
      cell: (group) => (
        <button
          type="button"
          className="press"
          aria-pressed={group.key === openKey}
          onClick={() => onOpen(group)}
          style={{
            minHeight: 'var(--row)',
            minWidth: 44,
            textAlign: 'left',
            font: `400 14px/20px ${face.mono}`,
            textDecoration: 'underline',
            textUnderlineOffset: 3,
          }}
        >
          {group.names}
        </button>
      ),
    },
    {
      key: 'family',
      header: 'family and organism',
      cell: ({ first }) => (
        <Row gap={10}>
          <FamilyOf family={families.get(first.familyId ?? '')} />
          <i style={{ overflowWrap: 'anywhere' }}>{first.organism}</i>
        </Row>
      ),
    },
    { key: 'identity', header: 'identity', numeric: true, cell: ({ first }) => orNone(first.identity) },
    { key: 'coverage', header: 'of the chain', numeric: true, cell: ({ first }) => orNone(first.coverage) },
    {
      key: 'strip',
      header: 'on the protein',
      cell: ({ first }) =>
        first.proteinLength === null ? null : (
          <CoverageStrip segments={first.segments} proteinLength={first.proteinLength} />
        ),
    },
    {
      key: 'mismatches',
      header: 'mismatches',
      numeric: true,
      cell: ({ first }) => (first.proteinId === null ? '' : mismatchCount(first)),
    },
    {
      key: 'next',
      header: 'runner-up',
      cell: ({ first, standing }) => (standing === 'no protein' ? '' : runnerUpWords(first)),
    },
    { key: 'standing', header: 'standing', cell: (group) => <StandingMark group={group} /> },
  ];
  return (
    <Table
      caption="Chains of the structure"
      columns={columns}
      rows={groups}
      keyOf={({ key }) => key}
      selectedKey={openKey}
    />
  );
}
