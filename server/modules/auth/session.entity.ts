import { Entity, ForeignKey, Index } from 'typeorm';
import { Ascii, Moment, Uuid, UuidPrimary } from '../../db/columns';

/** One renewing token. Only its hash is kept; each use replaces it by a successor of the same family. */
@Entity('session')
export class Session {
  @UuidPrimary() id!: string;
  @ForeignKey('Person') @Uuid() personId!: string;
  @Index() @Uuid() familyId!: string;
  @Ascii(64, { unique: true }) tokenHash!: string;
  @Moment() createdAt!: Date;
  @Moment() expiresAt!: Date;
  @Uuid({ nullable: true }) replacedBy!: string | null;
  @Moment({ nullable: true }) replacedAt!: Date | null;
  @Moment({ nullable: true }) revokedAt!: Date | null;
}
