import { Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { Ascii, Int } from '../../db/columns';

/** Author numbers of a chain's observed residues, in the shape of a numbering. */
@Entity('chain_label')
@Index(['chainId', 'firstNumber'])
export class ChainLabel {
  @ForeignKey('Chain') @PrimaryColumn({ type: 'uuid' }) chainId!: string;
  @PrimaryColumn({ type: 'int' }) chainIndex!: number;
  @Int() length!: number;
  @Int() firstNumber!: number;
  @Ascii(4) suffix!: string;
}
