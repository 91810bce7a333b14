import { z } from 'zod';
import { givenName, id } from './common';
import { endpoint } from './endpoint';

export const team = z.object({ id, name: z.string(), isLead: z.boolean() });
export type Team = z.infer<typeof team>;
export const newTeamBody = z.strictObject({ name: givenName });

export const teams = {
  list: endpoint({ name: 'teams.list', method: 'GET', path: '/teams', reply: z.array(team) }),
  make: endpoint({ name: 'teams.make', method: 'POST', path: '/teams', body: newTeamBody, reply: team }),
};
