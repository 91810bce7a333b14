import { Entity, ForeignKey, PrimaryColumn, Unique } from 'typeorm';
import { LongText, Moment, Uuid } from '../../db/columns';

/** Its order in the thread is its event number. */
@Entity('message')
@Unique(['authorId', 'clientKey'])
export class Message {
  @ForeignKey('Thread') @PrimaryColumn({ type: 'uuid' }) threadId!: string;
  @PrimaryColumn({ type: 'int' }) eventNumber!: number;
  @Uuid({ unique: true }) id!: string;
  @ForeignKey('Person') @Uuid() authorId!: string;
  @Uuid() clientKey!: string;
  @LongText() text!: string;
  @Moment() createdAt!: Date;
}
