import { Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { Int, Json, Uuid } from '../../db/columns';

@Entity('pin')
@Index(['proteinId', 'residueIndex'])
export class Pin {
  @ForeignKey('Annotation') @PrimaryColumn({ type: 'uuid' }) annotationId!: string;
  @PrimaryColumn({ type: 'int' }) ordinal!: number;
  @ForeignKey('Protein') @Uuid() proteinId!: string;
  @Int() residueIndex!: number;
  @Uuid({ nullable: true }) structureId!: string | null;
  @Json({ nullable: true }) chains!: string[] | null;
}
