import { Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { Ascii, Int } from '../../db/columns';

@Entity('numbering_segment')
@Index(['numberingId', 'firstNumber'])
export class NumberingSegment {
  @ForeignKey('Numbering') @PrimaryColumn({ type: 'uuid' }) numberingId!: string;
  @PrimaryColumn({ type: 'int' }) residueIndex!: number;
  @Int() length!: number;
  @Int() firstNumber!: number;
  @Ascii(4) suffix!: string;
}
