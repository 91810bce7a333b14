import { Entity, ForeignKey } from 'typeorm';
import { Made, Name, Uuid, UuidPrimary, Version } from '../../db/columns';

@Entity('alignment')
export class Alignment extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Family') @Uuid() familyId!: string;
  @Name() name!: string;
  @Uuid({ nullable: true }) currentRevisionId!: string | null;
  @Version() version!: number;
}
