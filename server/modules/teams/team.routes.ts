import { teams } from '../../../shared/contracts';
import type { Routes } from '../../http';
import type { TeamService } from './team.service';

export function addTeamRoutes(routes: Routes, service: TeamService): void {
  routes.add(teams.list, ({ personId }) => service.ofPerson(personId));
  routes.add(teams.make, ({ personId, body }) => service.make(personId, body.name));
}
