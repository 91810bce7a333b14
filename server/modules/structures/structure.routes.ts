import { structures } from '../../../shared/contracts';
import type { Routes } from '../../http';
import type { ProjectAccess } from '../projects';
import type { StructureAccess } from './structure.access';
import type { StructureQueries } from './structure.queries';

export function addStructureRoutes(
  routes: Routes,
  projects: ProjectAccess,
  access: StructureAccess,
  queries: StructureQueries,
): void {
  routes.add(structures.list, async ({ personId, params }) => {
    await projects.may(personId, params.projectId, 'read project');
    return queries.ofProject(params.projectId);
  });
  routes.add(structures.read, async ({ personId, params }) =>
    queries.withChains(await access.structure(personId, params.projectId, params.structureId)),
  );
}
