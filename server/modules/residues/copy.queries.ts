import type { ChainCopy } from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';

interface CopyRow {
  structureId: string;
  structureName: string;
  chainId: string;
  authorId: string;
  status: string;
  chainIndex: number | null;
  letter: string | null;
  /** JSON columns come parsed from the driver. */
  alternates: number[];
  exceptions: { kind: string; residueIndex: number | null }[];
  firstNumber: number | null;
  suffix: string | null;
  labelStart: number | null;
}

/** Every chain of a current structure revision that is mapped to the protein, with the residue's author number. */
export class CopyQueries {
  constructor(private readonly unitOfWork: UnitOfWork) {}

  async copies(proteinId: string, residueIndex: number): Promise<ChainCopy[]> {
    const rows: CopyRow[] = await this.unitOfWork.reader.query(
      `SELECT st.id structureId, st.name structureName, c.id chainId, c.author_id authorId, m.status,
              g.chain_start + ? - g.protein_start chainIndex,
              IF(g.length IS NULL, NULL, SUBSTRING(c.observed, g.chain_start + ? - g.protein_start + 1, 1)) letter,
              c.alternates, m.exceptions, l.first_number firstNumber, l.suffix, l.chain_index labelStart
         FROM residue_map m
         JOIN chain c ON c.id = m.chain_id
         JOIN structure_revision rev ON rev.id = c.revision_id
         JOIN structure st ON st.id = rev.structure_id AND st.current_revision_id = rev.id
         LEFT JOIN map_segment g ON g.map_id = m.id AND g.protein_id = m.protein_id
              AND g.protein_start <= ? AND g.protein_start + g.length > ?
         LEFT JOIN chain_label l ON l.chain_id = c.id
              AND l.chain_index <= g.chain_start + ? - g.protein_start
              AND l.chain_index + l.length > g.chain_start + ? - g.protein_start
        WHERE m.protein_id = ? AND m.status <> 'left out'
        ORDER BY st.id, c.ordinal`,
      [residueIndex, residueIndex, residueIndex, residueIndex, residueIndex, residueIndex, proteinId],
    );
    return rows.map((row) => presentCopy(row, residueIndex));
  }
}

function presentCopy(row: CopyRow, residueIndex: number): ChainCopy {
  const { structureId, structureName, chainId, authorId, chainIndex, letter, exceptions, alternates } = row;
  const hasLabel = chainIndex !== null && row.firstNumber !== null && row.labelStart !== null;
  const number = hasLabel ? Number(row.firstNumber) + Number(chainIndex) - Number(row.labelStart) : null;
  return {
    structureId,
    structureName,
    chainId,
    authorId,
    label: number === null ? null : `${number}${row.suffix ?? ''}`,
    letter,
    state:
      chainIndex === null ? 'missing' : alternates.includes(Number(chainIndex)) ? 'alternates' : 'observed',
    confirmed: row.status !== 'proposed',
    engineered: exceptions.some((one) => one.kind === 'engineered' && one.residueIndex === residueIndex),
  };
}
