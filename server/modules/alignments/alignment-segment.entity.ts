import { Entity, Index, PrimaryColumn } from 'typeorm';
import { Int } from '../../db/columns';

/** Ungapped runs of a row. One range read by column finds a whole site. */
@Entity('alignment_segment')
@Index(['revisionId', 'columnStart'])
export class AlignmentSegment {
  @PrimaryColumn({ type: 'uuid' }) revisionId!: string;
  @PrimaryColumn({ type: 'int' }) rowIndex!: number;
  @PrimaryColumn({ type: 'int' }) columnStart!: number;
  @Int() proteinStart!: number;
  @Int() length!: number;
}
