import { Entity, ForeignKey, Index } from 'typeorm';
import { Made, Name, Uuid, UuidPrimary, Version } from '../../db/columns';

@Entity('construct')
@Index(['projectId', 'id'])
export class Construct extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Project') @Uuid() projectId!: string;
  @Name() name!: string;
  @Uuid({ nullable: true }) currentRevisionId!: string | null;
  @Version() version!: number;
}
