import { Column, Entity, ForeignKey } from 'typeorm';
import type { Design as DesignContract } from '../../../shared/contracts';
import { Ascii, Json, LongText, Made, Uuid, UuidPrimary, Yes } from '../../db/columns';

@Entity('design')
export class Design extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Mutant') @Uuid() mutantId!: string;
  @ForeignKey('ConstructRevision') @Uuid() constructRevisionId!: string;
  @Ascii(24) scheme!: DesignContract['scheme'];
  @Column({ type: 'int', name: 'design_rank' }) rank!: number;
  @Json() settings!: unknown;
  @Json() codons!: (Omit<DesignContract['codons'][number], 'residue'> & { residueIndex: number })[];
  @Json() checks!: DesignContract['checks'];
  @Json() reasons!: string[];
  @Ascii(64) productHash!: string;
  @Yes() withinLimits!: boolean;
  @Yes() proved!: boolean;
  @LongText() proof!: string;
  @Yes() chosen!: boolean;
}
