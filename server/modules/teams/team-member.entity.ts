import { Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm';
import { Made, Yes } from '../../db/columns';

/** A team lead may make projects; what one may see in a project comes from its own membership alone. */
@Entity('team_member')
@Index(['personId'])
export class TeamMember extends Made {
  @ForeignKey('Team') @PrimaryColumn({ type: 'uuid' }) teamId!: string;
  @ForeignKey('Person') @PrimaryColumn({ type: 'uuid' }) personId!: string;
  @Yes() isLead!: boolean;
}
