import { Entity, ForeignKey, Unique } from 'typeorm';
import { Ascii, Exact, Made, Residues, Uuid, UuidPrimary, Version } from '../../db/columns';

/** Its residues never change: everything hangs on them. A corrected sequence is a new protein that succeeds it. */
@Entity('protein')
@Unique(['familyId', 'residuesHash', 'organism'])
export class Protein extends Made {
  @UuidPrimary() id!: string;
  @ForeignKey('Family') @Uuid() familyId!: string;
  @ForeignKey('Project') @Uuid() projectId!: string;
  @Exact(120) organism!: string;
  @Exact(255) name!: string;
  @Residues() residues!: string;
  @Ascii(64) residuesHash!: string;
  @Uuid({ nullable: true }) succeedsId!: string | null;
  @Version() version!: number;
}
