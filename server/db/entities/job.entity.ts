import { Entity, Index, PrimaryGeneratedColumn } from 'typeorm';
import { Ascii, Int, Json, LongText, Moment, Name, Uuid } from '../columns';

export type JobState = 'ready' | 'running' | 'done' | 'failed' | 'cancelled';

/** Work to be done outside a request. The index is in claim order, so that takers lock only the row they take. */
@Entity('job')
@Index(['state', 'runAt', 'id'])
export class Job {
  @PrimaryGeneratedColumn({ type: 'bigint' }) id!: string;
  @Ascii(40) kind!: string;
  @Uuid({ nullable: true }) projectId!: string | null;
  @Ascii(120) subjectId!: string;
  @Json() payload!: unknown;
  @Ascii(12) state!: JobState;
  @Moment() runAt!: Date;
  @Int({ default: 0 }) attempts!: number;
  @Moment({ nullable: true }) leaseUntil!: Date | null;
  @Ascii(64, { nullable: true }) leasedBy!: string | null;
  @Name(60, { default: '' }) stage!: string;
  @Int({ default: 0 }) done!: number;
  @Int({ default: 0 }) total!: number;
  @LongText({ nullable: true }) error!: string | null;
  @Ascii(120, { nullable: true, unique: true }) dedupeKey!: string | null;
}
