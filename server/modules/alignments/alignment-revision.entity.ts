import { Entity, ForeignKey, Unique } from 'typeorm';
import type { Issue } from '../../../shared/sequence/parse-result';
import { Ascii, Exact, FileHash, Int, Json, Made, Uuid, UuidPrimary } from '../../db/columns';

/** Immutable but for its status. */
@Entity('alignment_revision')
@Unique(['alignmentId', 'revision'])
export class AlignmentRevision extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Alignment') @Uuid() alignmentId!: string;
  @Int() revision!: number;
  @ForeignKey('StoredFile') @FileHash() fileHash!: string;
  @Exact(255) fileName!: string;
  @Ascii(12) format!: string;
  @Int() rowCount!: number;
  @Int() columnCount!: number;
  @Json() issues!: Issue[];
  @Ascii(8) status!: 'preview' | 'current' | 'earlier';
}
