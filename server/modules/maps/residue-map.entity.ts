import { Entity, ForeignKey, Index } from 'typeorm';
import type { ChainMap } from '../../../shared/contracts';
import { Ascii, Json, LongText, Made, Moment, Real, Uuid, UuidPrimary, Version } from '../../db/columns';

/** Chain residue ↔ protein residue, as proposed and as a curator decided. */
@Entity('residue_map')
@Index(['proteinId'])
export class ResidueMap extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Chain') @Uuid({ unique: true }) chainId!: string;
  @ForeignKey('Family') @Uuid({ nullable: true }) familyId!: string | null;
  @ForeignKey('Protein') @Uuid({ nullable: true }) proteinId!: string | null;
  @Ascii(12) status!: 'proposed' | 'confirmed' | 'corrected' | 'left out';
  @Ascii(8) readiness!: 'ready' | 'look' | 'choose';
  @LongText() reason!: string;
  @Real({ nullable: true }) identity!: number | null;
  @Real({ nullable: true }) coverage!: number | null;
  @Json() exceptions!: ChainMap['exceptions'];
  @Uuid({ nullable: true }) decidedBy!: string | null;
  @Moment({ nullable: true }) decidedAt!: Date | null;
  @Version() version!: number;
}
