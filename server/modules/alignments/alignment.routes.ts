import { alignments } from '../../../shared/contracts';
import type { Routes } from '../../http';
import type { ProjectAccess } from '../projects';
import type { AlignmentQueries } from './alignment.queries';

export function addAlignmentRoutes(routes: Routes, projects: ProjectAccess, queries: AlignmentQueries): void {
  routes.add(alignments.list, async ({ personId, params }) => {
    await projects.may(personId, params.projectId, 'read project');
    return queries.ofProject(params.projectId);
  });
  routes.add(alignments.read, async ({ personId, params }) => {
    await projects.may(personId, params.projectId, 'read project');
    return queries.withRows(params.projectId, params.alignmentId);
  });
}
