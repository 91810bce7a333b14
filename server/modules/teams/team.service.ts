import { In } from 'typeorm';
import type { Team as TeamContract } from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';
import { newId } from '../../lib/new-id';
import { TeamMember } from './team-member.entity';
import { Team } from './team.entity';

export class TeamService {
  constructor(private readonly unitOfWork: UnitOfWork) {}

  async ofPerson(personId: string): Promise<TeamContract[]> {
    const memberships = await this.unitOfWork.reader.findBy(TeamMember, { personId });
    const teams = await this.unitOfWork.reader.find(Team, {
      where: { id: In(memberships.map((member) => member.teamId)) },
      order: { name: 'ASC', id: 'ASC' },
    });
    return teams.map(({ id, name }) => ({
      id,
      name,
      isLead: memberships.some((member) => member.teamId === id && member.isLead),
    }));
  }

  async make(personId: string, name: string): Promise<TeamContract> {
    return this.unitOfWork.write({ projectId: null, actorId: personId }, async (unit) => {
      const made = { createdAt: unit.at, createdBy: personId };
      const team = { id: newId(), name, ...made };
      await unit.manager.insert(Team, team);
      await unit.manager.insert(TeamMember, { teamId: team.id, personId, isLead: true, ...made });
      await unit.audit({ action: 'team.made', subjectKind: 'team', subjectId: team.id, after: { name } });
      return { id: team.id, name, isLead: true };
    });
  }
}
