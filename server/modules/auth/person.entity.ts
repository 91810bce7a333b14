import { Entity } from 'typeorm';
import { Exact, Moment, Name, UuidPrimary } from '../../db/columns';

@Entity('person')
export class Person {
  @UuidPrimary() id!: string;
  @Name(254, { unique: true }) email!: string;
  @Name() name!: string;
  @Exact(255) passwordHash!: string;
  @Moment() createdAt!: Date;
  @Moment({ nullable: true }) disabledAt!: Date | null;
}
