import type { UnitOfWork } from '../../db';
import type { AddressReading } from '../../../shared/sequence/address/types';
import { readLabel } from '../../../shared/sequence/numbering/label-text';

export interface FoundResidue {
  proteinId: string;
  residueIndex: number;
  organism: string;
  letter: string;
  /** The numbering or chain in which the label was found, in words. */
  where: string;
  isPreferred: boolean;
}

interface Row {
  proteinId: string;
  residueIndex: number;
  organism: string;
  residues: string;
  numberingName: string;
  preferredNumbering: string | null;
}

interface ChainRow {
  proteinId: string | null;
  residueIndex: number | null;
  organism: string | null;
  letter: string | null;
  structureName: string;
  authorId: string;
}

const escapeLike = (text: string) => text.replace(/[\\%_]/g, (sign) => `\\${sign}`);

/**
 * A qualifier names the organism or the row it came from, in any case; blanks and underscores are the same. Null when
 * nothing is left of it to look for.
 */
function patternOf(qualifier: string): string | null {
  const words = qualifier.toLowerCase().replace(/_/g, ' ').trim();
  return words === '' ? null : `%${escapeLike(words)}%`;
}
const likeQualifier = (...columns: string[]) =>
  `REPLACE(LOWER(CONCAT_WS(' ', ${columns.join(', ')})), '_', ' ') LIKE ?`;

/** Finds the residues of a project that a reading of an address can mean. One range read a reading. */
export class AddressLookup {
  constructor(private readonly unitOfWork: UnitOfWork) {}

  async byNumber(projectId: string, reading: AddressReading, limit: number): Promise<FoundResidue[]> {
    const label = readLabel(reading.label);
    if (!label) return [];
    const conditions = [
      'p.project_id = ?',
      's.first_number <= ?',
      's.first_number + s.length > ?',
      's.suffix = ?',
    ];
    const values: (string | number)[] = [projectId, label.number, label.number, label.suffix];
    if (reading.family !== null) {
      conditions.push('f.name = ?');
      values.push(reading.family);
    }
    if (reading.organism !== null) {
      const pattern = patternOf(reading.organism);
      if (pattern === null) return [];
      conditions.push(likeQualifier('p.organism', 'p.name'));
      values.push(pattern);
    }
    if (reading.numbering !== null) {
      conditions.push('LOWER(n.name) = ?');
      values.push(reading.numbering.toLowerCase().trim());
    }
    const rows: Row[] = await this.unitOfWork.reader.query(
      `SELECT p.id proteinId, s.residue_index + ? - s.first_number residueIndex, p.organism, p.residues,
              n.name numberingName, f.preferred_numbering preferredNumbering
         FROM numbering_segment s
         JOIN numbering n ON n.id = s.numbering_id
         JOIN protein p ON p.id = n.protein_id
         JOIN family f ON f.id = p.family_id
        WHERE ${conditions.join(' AND ')}
        ORDER BY f.sort, p.id, n.id LIMIT ?`,
      [label.number, ...values, limit],
    );
    return rows.map((row) => ({
      proteinId: row.proteinId,
      residueIndex: Number(row.residueIndex),
      organism: row.organism,
      letter: row.residues.charAt(Number(row.residueIndex)),
      where: row.numberingName,
      isPreferred: row.numberingName === (row.preferredNumbering ?? 'sequence'),
    }));
  }

  /**
   * A chain of a current structure and its author number; behind `@` the structure may be named too. `unmapped` names
   * those that lead to no protein residue.
   */
  async byChain(
    projectId: string,
    reading: AddressReading,
  ): Promise<{ found: FoundResidue[]; unmapped: string[] }> {
    const label = readLabel(reading.label);
    const pattern = reading.organism === null ? '%' : patternOf(reading.organism);
    if (!label || reading.chainId === null || pattern === null) return { found: [], unmapped: [] };
    const at = 'l.chain_index + ? - l.first_number';
    const rows: ChainRow[] = await this.unitOfWork.reader.query(
      `SELECT m.protein_id proteinId, g.protein_start + ${at} - g.chain_start residueIndex, p.organism,
              IF(g.length IS NULL, NULL, SUBSTRING(p.residues, g.protein_start + ${at} - g.chain_start + 1, 1)) letter,
              st.name structureName, c.author_id authorId
         FROM structure st
         JOIN chain c ON c.revision_id = st.current_revision_id AND c.author_id = ?
         JOIN chain_label l ON l.chain_id = c.id AND l.first_number <= ? AND l.first_number + l.length > ? AND l.suffix = ?
         LEFT JOIN residue_map m ON m.chain_id = c.id AND m.status <> 'left out'
         LEFT JOIN map_segment g ON g.map_id = m.id AND g.chain_start <= ${at} AND g.chain_start + g.length > ${at}
         LEFT JOIN protein p ON p.id = m.protein_id
        WHERE st.project_id = ? AND ${likeQualifier('p.organism', 'p.name', 'st.name')} ORDER BY st.id`,
      [
        label.number,
        label.number,
        reading.chainId,
        label.number,
        label.number,
        label.suffix,
        label.number,
        label.number,
        projectId,
        pattern,
      ],
    );
    const found: FoundResidue[] = [];
    const unmapped: string[] = [];
    for (const row of rows) {
      const name = `${row.structureName}, chain ${row.authorId}`;
      if (row.proteinId === null || row.residueIndex === null || row.letter === null) {
        unmapped.push(
          `${name}: it has a residue ${reading.label}, but no map leads from there to a protein.`,
        );
        continue;
      }
      found.push({
        proteinId: row.proteinId,
        residueIndex: Number(row.residueIndex),
        organism: row.organism ?? '',
        letter: row.letter,
        where: name,
        isPreferred: true,
      });
    }
    return { found, unmapped };
  }
}
