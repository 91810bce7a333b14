export { TeamDirectory } from './team.directory';
export { TeamMember } from './team-member.entity';
export { Team } from './team.entity';
export { addTeamRoutes } from './team.routes';
export { TeamService } from './team.service';
