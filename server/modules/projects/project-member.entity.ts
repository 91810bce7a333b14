import { Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import type { Role } from '../../../shared/permissions';
import { Ascii, Made } from '../../db/columns';

/** All rights come from here. Removal deletes the row; the audit keeps that it was. */
@Entity('project_member')
@Index(['personId'])
export class ProjectMember extends Made {
  @ForeignKey('Project') @PrimaryColumn({ type: 'uuid' }) projectId!: string;
  @ForeignKey('Person') @PrimaryColumn({ type: 'uuid' }) personId!: string;
  @Ascii(12) role!: Role;
}
