import { Entity, ForeignKey, Index } from 'typeorm';
import { Ascii, Int, LongText, Made, Uuid, UuidPrimary, Version } from '../../db/columns';

@Entity('annotation')
@Index(['projectId', 'status', 'id'])
export class Annotation extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Project') @Uuid() projectId!: string;
  @Ascii(8) shape!: 'point' | 'pair' | 'path' | 'set';
  @Ascii(12) status!: 'proposed' | 'accepted' | 'contested' | 'retired';
  @LongText() statusReason!: string;
  @Int() currentVersion!: number;
  @Version() version!: number;
}
