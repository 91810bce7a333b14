import { Entity, Index, PrimaryGeneratedColumn } from 'typeorm';
import { Ascii, Json, Moment, Uuid } from '../columns';

/** Who did what, with what stood there before and after. */
@Entity('audit_entry')
@Index(['projectId', 'id'])
@Index(['subjectKind', 'subjectId', 'id'])
export class AuditEntry {
  @PrimaryGeneratedColumn({ type: 'bigint' }) id!: string;
  @Uuid({ nullable: true }) projectId!: string | null;
  @Uuid() actorId!: string;
  @Ascii(60) action!: string;
  @Ascii(40) subjectKind!: string;
  @Ascii(120) subjectId!: string;
  @Json({ nullable: true }) before!: object | null;
  @Json({ nullable: true }) after!: object | null;
  @Ascii(64) requestId!: string;
  @Moment() at!: Date;
}
