import { Entity, ForeignKey } from 'typeorm';
import type { Construct } from '../../../shared/contracts';
import { Int, Json, Made, Residues, Uuid, UuidPrimary, Yes } from '../../db/columns';

@Entity('construct_revision')
export class ConstructRevision extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Construct') @Uuid() constructId!: string;
  @Residues() bases!: string;
  @Yes() circular!: boolean;
  /** From 0. */
  @Int() codingStart!: number;
  @Int() codingLength!: number;
  @Int() geneticCode!: number;
  @Residues() encoded!: string;
  @ForeignKey('Protein') @Uuid() proteinId!: string;
  @Json() segments!: Construct['segments'];
  @Json() issues!: Construct['issues'];
}
