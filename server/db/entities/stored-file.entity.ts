import { Column, Entity, PrimaryColumn } from 'typeorm';
import { Ascii, Moment } from '../columns';

/** Bytes in the content-addressed store; reachable only through a row of the project that points to them. */
@Entity('stored_file')
export class StoredFile {
  @PrimaryColumn({ type: 'char', length: 64, charset: 'ascii', collation: 'ascii_bin' }) hash!: string;
  @Column({ type: 'bigint' }) bytes!: string;
  @Ascii(80) media!: string;
  @Moment() createdAt!: Date;
}
