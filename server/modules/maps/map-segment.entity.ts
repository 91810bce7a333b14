import { Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { Int, Uuid } from '../../db/columns';

@Entity('map_segment')
@Index(['proteinId', 'proteinStart'])
export class MapSegment {
  @ForeignKey('ResidueMap') @PrimaryColumn({ type: 'uuid' }) mapId!: string;
  @PrimaryColumn({ type: 'int' }) chainStart!: number;
  @Uuid() proteinId!: string;
  @Int() proteinStart!: number;
  @Int() length!: number;
}
