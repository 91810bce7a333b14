import type { Equivalent, Passport } from '@/shared/contracts/residues';
import type { LetterShare } from '@/components/residue';

/** One row of the residue's column: its own, an equivalent one, or one with a gap there. */
export type ColumnRow =
  | { kind: 'own'; key: string; organism: string; letter: string }
  | { kind: 'equivalent'; key: string; organism: string; letter: string; equivalent: Equivalent }
  | { kind: 'gap'; key: string; organism: string };

/** The rows of the column, the residue's own first, gaps last. */
export function columnRows({ residue, equivalents, gaps }: Passport): ColumnRow[] {
  return [
    { kind: 'own', key: residue.proteinId, organism: residue.organism, letter: residue.letter },
    ...equivalents.map((equivalent) => ({
      kind: 'equivalent' as const,
      key: `${equivalent.proteinId}:${equivalent.residueIndex}`,
      organism: equivalent.organism,
      letter: equivalent.letter,
      equivalent,
    })),
    ...gaps.map(({ proteinId, rowName, organism }) => ({
      kind: 'gap' as const,
      key: `gap:${proteinId}:${rowName}`,
      organism: organism || rowName,
    })),
  ];
}

/** How the counted rows divide over the letters of the column; gaps stand last, as a letter of their own. */
export function letterShares(column: NonNullable<Passport['column']>): {
  shares: LetterShare[];
  rowCount: number;
} {
  const { shares, gapCount } = column;
  const rowCount = shares.reduce((sum, { count }) => sum + count, gapCount);
  const gap = gapCount > 0 ? [{ letter: '-', count: gapCount }] : [];
  return {
    rowCount,
    shares: [...shares, ...gap].map(({ letter, count }) => ({
      letter,
      rowCount: count,
      share: rowCount === 0 ? 0 : count / rowCount,
    })),
  };
}
