import { Column, PrimaryColumn, VersionColumn, type ColumnOptions } from 'typeorm';

/**
 * The kinds of column every table is made of. Types are always stated: the runtime emits no decorator metadata.
 * Residue text, labels, hashes and file names compare byte by byte; names that people search do not.
 */
export const UuidPrimary = () => PrimaryColumn({ type: 'uuid' });
export const Uuid = (options: ColumnOptions = {}) => Column({ type: 'uuid', ...options });
export const Ascii = (length: number, options: ColumnOptions = {}) =>
  Column({ type: 'varchar', length, charset: 'ascii', collation: 'ascii_bin', ...options });
/** Key of the content-addressed store. */
export const FileHash = (options: ColumnOptions = {}) =>
  Column({ type: 'char', length: 64, charset: 'ascii', collation: 'ascii_bin', ...options });
export const Exact = (length: number, options: ColumnOptions = {}) =>
  Column({ type: 'varchar', length, charset: 'utf8mb4', collation: 'utf8mb4_bin', ...options });
export const Name = (length = 120, options: ColumnOptions = {}) =>
  Column({ type: 'varchar', length, ...options });
export const LongText = (options: ColumnOptions = {}) => Column({ type: 'mediumtext', ...options });
/** Residues and bases: plain letters, possibly very many. */
export const Residues = (options: ColumnOptions = {}) =>
  Column({ type: 'mediumtext', charset: 'ascii', collation: 'ascii_bin', ...options });
export const Int = (options: ColumnOptions = {}) => Column({ type: 'int', ...options });
export const Yes = (options: ColumnOptions = {}) => Column({ type: 'boolean', ...options });
export const Real = (options: ColumnOptions = {}) => Column({ type: 'double', ...options });
export const Json = (options: ColumnOptions = {}) => Column({ type: 'json', ...options });
export const Moment = (options: ColumnOptions = {}) => Column({ type: 'datetime', precision: 3, ...options });
export const Version = () => VersionColumn({ type: 'int' });

/** When and by whom a row was made; on every table but the machinery. */
export abstract class Made {
  @Moment() createdAt!: Date;
  @Uuid() createdBy!: string;
}
