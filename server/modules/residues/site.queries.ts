import {
  gradeEquivalence,
  letterRelation,
  type EquivalenceGrade,
  type LetterRelation,
} from '../../../shared/sequence/mapping/equivalence-grade';
import type { UnitOfWork } from '../../db';

export interface SiteMember {
  proteinId: string;
  residueIndex: number;
  organism: string;
  rowName: string;
  letter: string;
  grade: EquivalenceGrade;
  relation: LetterRelation;
}

export interface Site {
  column: {
    alignmentId: string;
    alignmentName: string;
    revision: number;
    column: number;
    rowCount: number;
  } | null;
  /** The other residues of the column, in the order of the rows; each protein once. */
  members: SiteMember[];
  gaps: { proteinId: string; organism: string; rowName: string }[];
}

interface Place {
  revisionId: string;
  rowIndex: number;
  alignmentId: string;
  alignmentName: string;
  revision: number;
  rowCount: number;
  columnStart: number;
  proteinStart: number;
  length: number;
}

interface ColumnRow {
  rowIndex: number;
  rowName: string;
  proteinId: string;
  organism: string;
  proteinStart: number | null;
  columnStart: number | null;
  length: number | null;
  letter: string | null;
}

const alone: Site = { column: null, members: [], gaps: [] };

/**
 * A site: a residue with its equivalents, by column in the current revision of its family's reference alignment.
 * Computed each time, never stored. Three queries whatever the size of the family.
 */
export class SiteQueries {
  constructor(private readonly unitOfWork: UnitOfWork) {}

  async site(proteinId: string, residueIndex: number): Promise<Site> {
    const place = await this.placeOf(proteinId, residueIndex);
    if (!place) return alone;
    const column = place.columnStart + residueIndex - place.proteinStart;
    const rows = await this.columnRows(place.revisionId, column);
    const own = rows.find((row) => row.proteinId === proteinId && row.letter !== null);
    const gaps = rows.filter((row) => row.letter === null);
    const gapShare = gaps.length / Math.max(1, rows.length);
    const seen = new Set([proteinId]);
    const members: SiteMember[] = [];
    for (const row of rows) {
      if (
        row.letter === null ||
        row.proteinStart === null ||
        row.columnStart === null ||
        seen.has(row.proteinId)
      )
        continue;
      seen.add(row.proteinId);
      const relation = letterRelation(own?.letter ?? 'X', row.letter);
      members.push({
        proteinId: row.proteinId,
        residueIndex: row.proteinStart + column - row.columnStart,
        organism: row.organism,
        rowName: row.rowName,
        letter: row.letter,
        relation,
        grade: gradeEquivalence({
          relation,
          gapShare,
          besideGap: besideGap(own, column) || besideGap(row, column),
        }),
      });
    }
    const { alignmentId, alignmentName, revision, rowCount } = place;
    return {
      column: { alignmentId, alignmentName, revision, column, rowCount },
      members,
      gaps: gaps.map(({ proteinId: id, organism, rowName }) => ({ proteinId: id, organism, rowName })),
    };
  }

  private async placeOf(proteinId: string, residueIndex: number): Promise<Place | null> {
    const places: Place[] = await this.unitOfWork.reader.query(
      `SELECT r.revision_id revisionId, r.row_index rowIndex, al.id alignmentId, al.name alignmentName,
              rev.revision, rev.row_count rowCount, s.column_start columnStart, s.protein_start proteinStart, s.length
         FROM protein p
         JOIN family f ON f.id = p.family_id
         JOIN alignment al ON al.id = f.reference_alignment_id
         JOIN alignment_revision rev ON rev.id = al.current_revision_id
         JOIN alignment_row r ON r.protein_id = p.id AND r.revision_id = rev.id
         JOIN alignment_segment s ON s.revision_id = r.revision_id AND s.row_index = r.row_index
        WHERE p.id = ? AND s.protein_start <= ? AND s.protein_start + s.length > ?
        ORDER BY r.row_index LIMIT 1`,
      [proteinId, residueIndex, residueIndex],
    );
    return places[0] ?? null;
  }

  private columnRows(revisionId: string, column: number): Promise<ColumnRow[]> {
    return this.unitOfWork.reader.query(
      `SELECT r.row_index rowIndex, r.name rowName, r.protein_id proteinId, p.organism,
              s.protein_start proteinStart, s.column_start columnStart, s.length,
              IF(s.length IS NULL, NULL, SUBSTRING(p.residues, s.protein_start + ? - s.column_start + 1, 1)) letter
         FROM alignment_row r
         JOIN protein p ON p.id = r.protein_id
         LEFT JOIN alignment_segment s ON s.revision_id = r.revision_id AND s.row_index = r.row_index
              AND s.column_start <= ? AND s.column_start + s.length > ?
        WHERE r.revision_id = ? ORDER BY r.row_index`,
      [column, column, column, revisionId],
    );
  }
}

function besideGap(row: ColumnRow | undefined, column: number): boolean {
  if (!row || row.columnStart === null || row.length === null) return false;
  return column === row.columnStart || column === row.columnStart + row.length - 1;
}
