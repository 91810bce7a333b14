import { Entity, ForeignKey, Index } from 'typeorm';
import type { Issue } from '../../../shared/sequence/parse-result';
import { Ascii, Exact, FileHash, Json, Made, Name, Uuid, UuidPrimary, Version } from '../../db/columns';

@Entity('upload')
@Index(['projectId', 'id'])
@Index(['revisionId'])
export class Upload extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Project') @Uuid() projectId!: string;
  @Ascii(12) kind!: 'alignment' | 'structure';
  @Uuid({ nullable: true }) familyId!: string | null;
  /** Name the alignment or structure is to get. */
  @Name() name!: string;
  @ForeignKey('StoredFile') @FileHash() fileHash!: string;
  @Exact(255) fileName!: string;
  @Ascii(12) state!: 'received' | 'reading' | 'waiting' | 'done' | 'refused';
  @Json() issues!: Issue[];
  @Uuid({ nullable: true }) alignmentId!: string | null;
  @Uuid({ nullable: true }) structureId!: string | null;
  @Uuid({ nullable: true }) revisionId!: string | null;
  @Version() version!: number;
}
