import { Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { Exact, Residues, Uuid } from '../../db/columns';

@Entity('alignment_row')
@Index(['proteinId'])
export class AlignmentRow {
  @ForeignKey('AlignmentRevision') @PrimaryColumn({ type: 'uuid' }) revisionId!: string;
  @PrimaryColumn({ type: 'int' }) rowIndex!: number;
  @Exact(255) name!: string;
  @ForeignKey('Protein') @Uuid() proteinId!: string;
  /** As in the file. */
  @Residues() text!: string;
}
