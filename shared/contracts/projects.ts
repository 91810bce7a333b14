import { z } from 'zod';
import { roles } from '../permissions';
import { email } from './auth';
import { eventNumber, givenName, id, moment, projectParams, version } from './common';
import { endpoint } from './endpoint';

export const role = z.enum(roles);
export const motorKind = z.enum(['F', 'V', 'A']);

/** The same for every member; what one may do follows from one's own membership. */
export const project = z.object({
  id,
  teamId: id,
  teamName: z.string(),
  name: z.string(),
  motorKind,
  readersMayComment: z.boolean(),
  invented: z.boolean(),
  version,
});
export type Project = z.infer<typeof project>;
export const ownProject = project.extend({ role, head: eventNumber });
export type OwnProject = z.infer<typeof ownProject>;

export const newProjectBody = z.strictObject({ teamId: id, name: givenName, motorKind });
export const projectSettingsBody = z.strictObject({ name: givenName, readersMayComment: z.boolean() });

export const member = z.object({ personId: id, name: z.string(), email: z.string(), role, since: moment });
export type Member = z.infer<typeof member>;
export const addMemberBody = z.strictObject({ email, role });
const memberParams = z.strictObject({ projectId: id, personId: id });

export const projectEvent = z.object({
  projectId: id,
  eventNumber,
  kind: z.string(),
  subjectId: z.string(),
  actor: z.object({ id, name: z.string() }),
  at: moment,
  payload: z.unknown(),
});
export type ProjectEvent = z.infer<typeof projectEvent>;

export const eventsReply = z.object({
  events: z.array(projectEvent),
  head: eventNumber,
  /** Too far behind: forget what you hold and read everything again. */
  readAfresh: z.boolean(),
});

export const projects = {
  list: endpoint({ name: 'projects.list', method: 'GET', path: '/projects', reply: z.array(ownProject) }),
  make: endpoint({
    name: 'projects.make',
    method: 'POST',
    path: '/projects',
    body: newProjectBody,
    reply: ownProject,
  }),
  read: endpoint({
    name: 'projects.read',
    method: 'GET',
    path: '/projects/:projectId',
    params: projectParams,
    reply: ownProject,
  }),
  change: endpoint({
    name: 'projects.change',
    method: 'PATCH',
    path: '/projects/:projectId',
    params: projectParams,
    versioned: true,
    body: projectSettingsBody,
    reply: project,
  }),
  members: endpoint({
    name: 'projects.members',
    method: 'GET',
    path: '/projects/:projectId/members',
    params: projectParams,
    reply: z.array(member),
  }),
  addMember: endpoint({
    name: 'projects.addMember',
    method: 'POST',
    path: '/projects/:projectId/members',
    params: projectParams,
    body: addMemberBody,
    reply: member,
  }),
  changeMember: endpoint({
    name: 'projects.changeMember',
    method: 'PATCH',
    path: '/projects/:projectId/members/:personId',
    params: memberParams,
    body: z.strictObject({ role }),
    reply: member,
  }),
  removeMember: endpoint({
    name: 'projects.removeMember',
    method: 'DELETE',
    path: '/projects/:projectId/members/:personId',
    params: memberParams,
    reply: z.object({ personId: id }),
  }),
  events: endpoint({
    name: 'projects.events',
    method: 'GET',
    path: '/projects/:projectId/events',
    params: projectParams,
    query: z.strictObject({ after: z.coerce.number().int().min(0) }),
    reply: eventsReply,
  }),
};

export const projectEvents = {
  'project.changed': project,
  'member.added': member,
  'member.changed': member,
  'member.removed': z.object({ personId: id }),
};
