import { Entity } from 'typeorm';
import { Int, UuidPrimary } from '../columns';

/**
 * How many events a project has. A row of its own without foreign keys: a counter on the project row deadlocks
 * with child inserts, which take a shared lock on their parent. A unit of work locks it first, then reads.
 */
@Entity('stream_head')
export class StreamHead {
  @UuidPrimary() projectId!: string;
  @Int() eventNumber!: number;
}
