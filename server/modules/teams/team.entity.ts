import { Entity } from 'typeorm';
import { Made, Name, UuidPrimary } from '../../db/columns';

@Entity('team')
export class Team extends Made {
  @UuidPrimary() id!: string;
  @Name() name!: string;
}
