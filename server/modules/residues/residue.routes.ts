import { residues } from '../../../shared/contracts';
import type { Routes } from '../../http';
import type { ProjectAccess } from '../projects';
import type { LocateQueries } from './locate.queries';
import type { PassportQueries } from './passport.queries';

export function addResidueRoutes(
  routes: Routes,
  projects: ProjectAccess,
  passports: PassportQueries,
  locate: LocateQueries,
): void {
  routes.add(residues.locate, async ({ personId, params, query }) => {
    await projects.may(personId, params.projectId, 'read project');
    return locate.locate(params.projectId, query.text);
  });
  routes.add(residues.passport, async ({ personId, params: { projectId, ...ref } }) => {
    await projects.may(personId, projectId, 'read project');
    return passports.passport(projectId, ref);
  });
}
