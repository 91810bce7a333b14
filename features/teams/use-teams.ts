import { useQuery, useQueryClient } from '@tanstack/react-query';
import { teams, type Team } from '@/shared/contracts/teams';
import { call } from '@/client/api';
import { byText } from '@/client/keep-newer';
import { useOwnAct } from '@/client/use-act';

const teamsKey = ['teams'];

/** The teams of the person signed in. */
export function useTeams() {
  return useQuery({ queryKey: teamsKey, queryFn: ({ signal }) => call(teams.list, { signal }) });
}

export function useMakeTeam() {
  const client = useQueryClient();
  return useOwnAct<{ name: string }, Team>({
    send: (body, idempotencyKey) => call(teams.make, { body, idempotencyKey }),
    take: (made) =>
      client.setQueryData<Team[]>(
        teamsKey,
        (list) =>
          list &&
          [...list.filter(({ id }) => id !== made.id), made].sort((one, other) => byText(one.id, other.id)),
      ),
  });
}
