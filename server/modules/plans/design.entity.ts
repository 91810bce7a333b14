import { Column, Entity, ForeignKey } from 'typeorm';
import type { Design as DesignContract } from '../../../shared/contracts';
import { Ascii, Int, Json, LongText, Made, Uuid, UuidPrimary, Yes } from '../../db/columns';

@Entity('design')
export class Design extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Mutant') @Uuid() mutantId!: string;
  @ForeignKey('ConstructRevision') @Uuid() constructRevisionId!: string;
  @Ascii(24) scheme!: DesignContract['scheme'];
  @Column({ type: 'int', name: 'design_rank' }) rank!: number;
  @Json() settings!: unknown;
  @Json() codons!: {
    residueIndex: number;
    codonStart: number;
    codonFrom: string;
    codonTo: string;
    share: number | null;
  }[];
  @Json() checks!: DesignContract['checks'];
  @Json() reasons!: string[];
  @Ascii(64) productHash!: string;
  @Yes() proved!: boolean;
  @LongText() proof!: string;
  @Yes() chosen!: boolean;
}
