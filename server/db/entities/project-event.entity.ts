import { Entity, PrimaryColumn } from 'typeorm';
import { Ascii, Json, Moment, Uuid } from '../columns';

/** A fact announced to a project, numbered without gaps, kept for ever. */
@Entity('project_event')
export class ProjectEventRow {
  @PrimaryColumn({ type: 'uuid' }) projectId!: string;
  @PrimaryColumn({ type: 'int' }) eventNumber!: number;
  @Ascii(40) kind!: string;
  @Ascii(120) subjectId!: string;
  @Uuid() actorId!: string;
  @Json() payload!: unknown;
  @Moment() at!: Date;
}
