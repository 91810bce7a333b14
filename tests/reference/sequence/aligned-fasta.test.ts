import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { cellsOfColumn, columnOfResidue, residueAtColumn } from '@/shared/sequence/alignment/columns';
import { readAlignment } from '@/shared/sequence/alignment/read-alignment';
import type { Alignment } from '@/shared/sequence/alignment/types';
import { columnIndex, residueIndex } from '@/shared/sequence/positions';

const fixtures = join(__dirname, '../../fixtures');

interface Answer {
  rows: number;
  columns: number;
  ids: string[];
  ungapped_lengths: number[];
  ungapped_sha256_first: string;
  total_gaps: number;
  /** gaps, distinct letters, most common letter, its count, … */
  columns_stats: [number, number, string, number, number, number][];
  residue_to_column_1based: Record<string, number[]>;
}

function read(file: string): Alignment {
  const { value, issues } = readAlignment(readFileSync(join(fixtures, 'alignments', file)));
  expect(issues.filter((issue) => issue.severity === 'error')).toEqual([]);
  if (value === null) throw new Error(`${file} was not read`);
  return value;
}

// Source of the answers: Biopython 1.80 (settings in each JSON file). The answers of the two files that were
// written in several formats hold for the aligned FASTA as well: same rows, same columns.
describe.each([
  ['delta_mafft.afa', 'delta_mafft.afa.json'],
  ['c_small_mafft.afa', 'c_small_mafft.sto.json'],
  ['gamma_small_mafft.afa', 'gamma_small_mafft.aln.json'],
])('%s read as a reference library reads it', (file, answerFile) => {
  const answer: Answer = JSON.parse(readFileSync(join(fixtures, 'expected/alignments', answerFile), 'utf8'))
    .alignments[0];
  const alignment = read(file);

  test('rows, names, lengths and gaps', () => {
    expect(alignment.rows.map((row) => row.name)).toEqual(answer.ids);
    expect(alignment.columnCount).toBe(answer.columns);
    expect(alignment.rows.map((row) => row.residues.length)).toEqual(answer.ungapped_lengths);
    const first = alignment.rows[0]?.residues ?? '';
    expect(createHash('sha256').update(first).digest('hex')).toBe(answer.ungapped_sha256_first);
    const gaps = alignment.rows.reduce((sum, row) => sum + alignment.columnCount - row.residues.length, 0);
    expect(gaps).toBe(answer.total_gaps);
  });

  test('what stands in every column', () => {
    answer.columns_stats.forEach(([gaps, distinct, common, count], column) => {
      const letters = cellsOfColumn(alignment, columnIndex(column)).map((cell) => cell.letter);
      const present = letters.filter((letter) => letter !== null);
      expect({ column, gaps: letters.length - present.length }).toEqual({ column, gaps });
      expect({ column, distinct: new Set(present).size }).toEqual({ column, distinct });
      expect(present.filter((letter) => letter === common)).toHaveLength(count);
    });
  });

  test('the column of every residue, and back', () => {
    for (const [name, columns] of Object.entries(answer.residue_to_column_1based)) {
      const row = alignment.rows.find((candidate) => candidate.name === name);
      if (row === undefined) throw new Error(`no row ${name}`);
      expect(columns).toHaveLength(row.residues.length);
      const found = columns.map((_, index) => Number(columnOfResidue(row, residueIndex(index))) + 1);
      expect(found).toEqual(columns);
      const back = columns.map((column) => residueAtColumn(row, columnIndex(column - 1)));
      expect(back).toEqual(columns.map((_, index) => index));
    }
  });
});
