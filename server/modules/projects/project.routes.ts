import { projects } from '../../../shared/contracts';
import type { Routes } from '../../http';
import type { TeamDirectory } from '../teams';
import type { ProjectAccess } from './project.access';
import { presentOwnProject } from './project.presenter';
import type { ProjectQueries } from './project.queries';
import type { ProjectService } from './project.service';

export function addProjectRoutes(
  routes: Routes,
  access: ProjectAccess,
  service: ProjectService,
  queries: ProjectQueries,
  teams: TeamDirectory,
): void {
  routes.add(projects.list, ({ personId }) => queries.ofPerson(personId));
  routes.add(projects.make, ({ personId, body }) => service.make(personId, body));
  routes.add(projects.read, async ({ personId, params }) => {
    const { project, role } = await access.membership(personId, params.projectId);
    const names = await teams.names([project.teamId]);
    return presentOwnProject(project, names.get(project.teamId) ?? '', role, await queries.head(project.id));
  });
  routes.add(projects.change, ({ personId, params, version, body }) =>
    service.change(personId, params.projectId, version, body),
  );
  routes.add(projects.members, async ({ personId, params }) => {
    await access.may(personId, params.projectId, 'read project');
    return queries.members(params.projectId);
  });
  routes.add(projects.addMember, ({ personId, params, body }) =>
    service.addMember(personId, params.projectId, body.email, body.role),
  );
  routes.add(projects.changeMember, ({ personId, params, body }) =>
    service.changeMember(personId, params.projectId, params.personId, body.role),
  );
  routes.add(projects.removeMember, ({ personId, params }) =>
    service.removeMember(personId, params.projectId, params.personId),
  );
  routes.add(projects.events, async ({ personId, params, query }) => {
    await access.may(personId, params.projectId, 'read project');
    return queries.eventsAfter(params.projectId, query.after);
  });
}
