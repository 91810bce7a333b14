import { Entity, ForeignKey } from 'typeorm';
import { Ascii, Made, Moment, Name, Uuid, UuidPrimary, Version, Yes } from '../../db/columns';

@Entity('project')
export class Project extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Team') @Uuid() teamId!: string;
  @Name() name!: string;
  @Ascii(1) motorKind!: 'F' | 'V' | 'A';
  @Yes({ default: false }) readersMayComment!: boolean;
  /** Demo data: every screen says so. */
  @Yes({ default: false }) invented!: boolean;
  @Moment({ nullable: true }) archivedAt!: Date | null;
  @Version() version!: number;
}
