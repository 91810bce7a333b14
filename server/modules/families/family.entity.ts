import { Entity, ForeignKey, Unique } from 'typeorm';
import type { Part } from '../../../shared/contracts';
import { Ascii, Exact, Int, Json, Made, Name, Uuid, UuidPrimary, Version, Yes } from '../../db/columns';

@Entity('family')
@Unique(['projectId', 'name'])
export class Family extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Project') @Uuid() projectId!: string;
  /** Case counts: E and e are different subunits. */
  @Exact(24) name!: string;
  @Json() aliases!: string[];
  @Name(80) description!: string;
  @Ascii(8) part!: Part;
  @Yes() catalytic!: boolean;
  @Uuid({ nullable: true }) referenceAlignmentId!: string | null;
  /** Name of the numbering shown first on proteins that have it. */
  @Exact(40, { nullable: true }) preferredNumbering!: string | null;
  @Int() sort!: number;
  @Version() version!: number;
}
