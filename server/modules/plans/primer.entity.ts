import { Column, Entity, ForeignKey, PrimaryColumn } from 'typeorm';
import { Ascii, Int, Json, Name } from '../../db/columns';

@Entity('primer')
export class Primer {
  @ForeignKey('Design') @PrimaryColumn({ type: 'uuid' }) designId!: string;
  @PrimaryColumn({ type: 'int' }) ordinal!: number;
  @Name(60) name!: string;
  /** 5′→3′. */
  @Ascii(200) bases!: string;
  @Ascii(1) strand!: '+' | '-';
  @Column({ type: 'int', name: 'start_base' }) start!: number;
  @Int() length!: number;
  @Json() figures!: {
    gcPercent: number;
    meltingCelsius: number | null;
    annealingCelsius: number | null;
    hairpinKcalPerMol: number;
    selfDimerKcalPerMol: number;
    misprimingSites: number;
  };
}
