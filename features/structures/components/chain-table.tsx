import type { ChainMap } from '@/shared/contracts/maps';
import { face } from '@/components/theme';
import { Row, Table, type TableColumn } from '@/components/ui';
import { CoverageStrip, mismatchCount, percentWords, StandingMark, type ChainGroup } from '@/features/maps';
import { runnerUpName, runnerUpWords } from '../chain-words';
import { FamilyOf, type ChainsProps } from './chain-list';

const orNone = (fraction: number | null): string => (fraction === null ? '' : percentWords(fraction));

function nextCell(chain: ChainMap, standing: ChainGroup['standing']): string {
  if (standing === 'no protein') return '';
  return chain.proteinId === null ? `${runnerUpName(chain)} ${runnerUpWords(chain)}` : runnerUpWords(chain);
}

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
      cell: ({ first, standing }) => (
        <Row gap={10}>
          <FamilyOf family={families.get(first.familyId ?? '')} isProtein={standing !== 'no protein'} />
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
      cell: ({ first, standing }) => nextCell(first, standing),
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
