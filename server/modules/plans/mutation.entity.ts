import { Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { Ascii, Int, Uuid } from '../../db/columns';

@Entity('mutation')
@Index(['proteinId', 'residueIndex'])
export class Mutation {
  @ForeignKey('Mutant') @PrimaryColumn({ type: 'uuid' }) mutantId!: string;
  @PrimaryColumn({ type: 'int' }) ordinal!: number;
  @ForeignKey('Protein') @Uuid() proteinId!: string;
  @Int() residueIndex!: number;
  @Int() length!: number;
  @Ascii(200) oldResidues!: string;
  @Ascii(200) newResidues!: string;
}
