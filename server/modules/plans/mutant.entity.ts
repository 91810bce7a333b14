import { Entity, ForeignKey, Index } from 'typeorm';
import type { Mutant as MutantContract } from '../../../shared/contracts';
import { Ascii, LongText, Made, Uuid, UuidPrimary, Version } from '../../db/columns';

@Entity('mutant')
@Index(['projectId', 'id'])
export class Mutant extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Project') @Uuid() projectId!: string;
  /** A wish may come before its DNA. */
  @ForeignKey('Construct') @Uuid({ nullable: true }) constructId!: string | null;
  @Ascii(12) state!: MutantContract['state'];
  @LongText() reason!: string;
  @Version() version!: number;
}
