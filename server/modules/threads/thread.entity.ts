import { Entity, ForeignKey, Index, Unique } from 'typeorm';
import { Ascii, Int, Made, Uuid, UuidPrimary, Yes } from '../../db/columns';

/** A subject has one main thread, made by its first message: `main` is true or null, and nulls never clash. */
@Entity('thread')
@Unique(['projectId', 'subjectKey', 'main'])
@Index(['projectId', 'lastEventNumber'])
export class Thread extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Project') @Uuid() projectId!: string;
  @Ascii(12) subjectKind!: 'residue' | 'annotation' | 'mutant' | 'structure';
  @Uuid({ nullable: true }) subjectId!: string | null;
  @Uuid({ nullable: true }) proteinId!: string | null;
  @Int({ nullable: true }) residueIndex!: number | null;
  @Ascii(120) subjectKey!: string;
  @Yes({ nullable: true }) main!: boolean | null;
  @Int() messageCount!: number;
  @Int() lastEventNumber!: number;
}
