import { In } from 'typeorm';
import type { UnitOfWork } from '../../db';
import { forbidden, notFound } from '../../lib/problem';
import { TeamMember } from './team-member.entity';
import { Team } from './team.entity';

/** What other modules may know of teams. */
export class TeamDirectory {
  constructor(private readonly unitOfWork: UnitOfWork) {}

  async names(teamIds: readonly string[]): Promise<Map<string, string>> {
    const teams = await this.unitOfWork.reader.findBy(Team, { id: In([...new Set(teamIds)]) });
    return new Map(teams.map((team) => [team.id, team.name]));
  }

  /** The team, when this person leads it. */
  async ledBy(personId: string, teamId: string): Promise<Team> {
    const member = await this.unitOfWork.reader.findOneBy(TeamMember, { teamId, personId });
    const team = member && (await this.unitOfWork.reader.findOneBy(Team, { id: teamId }));
    if (!member || !team) throw notFound('team');
    if (!member.isLead) throw forbidden('Only a lead of the team makes projects. Ask one of them.');
    return team;
  }
}
