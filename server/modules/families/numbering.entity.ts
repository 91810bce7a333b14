import { Entity, ForeignKey, Unique } from 'typeorm';
import type { Numbering as NumberingContract } from '../../../shared/contracts';
import { Ascii, Exact, Json, Made, Uuid, UuidPrimary } from '../../db/columns';

@Entity('numbering')
@Unique(['proteinId', 'name'])
export class Numbering extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Protein') @Uuid() proteinId!: string;
  @Exact(40) name!: string;
  @Ascii(12) kind!: NumberingContract['kind'];
  /** What it was made from; the segments are derived and rewritten whole. */
  @Json() definition!: unknown;
}
