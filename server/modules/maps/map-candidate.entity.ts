import { Entity, ForeignKey, PrimaryColumn } from 'typeorm';
import { Real, Uuid } from '../../db/columns';

/** The proteins a chain resembles most, best first; `rank` counts from 1. */
@Entity('map_candidate')
export class MapCandidate {
  @ForeignKey('Chain') @PrimaryColumn({ type: 'uuid' }) chainId!: string;
  @PrimaryColumn({ type: 'int', name: 'candidate_rank' }) rank!: number;
  @ForeignKey('Protein') @Uuid() proteinId!: string;
  @Real() identity!: number;
  @Real() coverage!: number;
}
