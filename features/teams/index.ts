export { useMakeTeam, useTeams } from './use-teams';
