import { Entity, ForeignKey, Unique } from 'typeorm';
import type { Issue } from '../../../shared/sequence/parse-result';
import { Ascii, Exact, FileHash, Int, Json, Made, Name, Uuid, UuidPrimary } from '../../db/columns';

/** Immutable but for its status. */
@Entity('structure_revision')
@Unique(['structureId', 'revision'])
export class StructureRevision extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Structure') @Uuid() structureId!: string;
  @Int() revision!: number;
  @ForeignKey('StoredFile') @FileHash() fileHash!: string;
  @Exact(255) fileName!: string;
  @Ascii(12) format!: string;
  @Name(500) title!: string;
  @Int() modelCount!: number;
  @Int() chainCount!: number;
  @Int() atomCount!: number;
  @Json() issues!: Issue[];
  @Ascii(8) status!: 'preview' | 'current' | 'earlier';
}
