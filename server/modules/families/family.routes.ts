import { families } from '../../../shared/contracts';
import type { Routes } from '../../http';
import type { ProjectAccess } from '../projects';
import type { FamilyAccess } from './family.access';
import type { FamilyQueries } from './family.queries';
import type { FamilyService } from './family.service';
import type { ProteinService } from './protein.service';

interface Parts {
  projects: ProjectAccess;
  access: FamilyAccess;
  queries: FamilyQueries;
  service: FamilyService;
  proteins: ProteinService;
}

export function addFamilyRoutes(
  routes: Routes,
  { projects, access, queries, service, proteins }: Parts,
): void {
  routes.add(families.list, async ({ personId, params }) => {
    await projects.may(personId, params.projectId, 'read project');
    return queries.ofProject(params.projectId);
  });
  routes.add(families.make, ({ personId, params, body }) => service.make(personId, params.projectId, body));
  routes.add(families.proteins, async ({ personId, params }) => {
    const family = await access.family(personId, params.projectId, params.familyId);
    return queries.proteins(family.id);
  });
  routes.add(families.protein, async ({ personId, params }) =>
    queries.protein(await access.protein(personId, params.projectId, params.proteinId)),
  );
  routes.add(families.renameProtein, ({ personId, params, version, body }) =>
    proteins.rename(personId, params.projectId, params.proteinId, version, body.organism),
  );
  routes.add(families.setOffsetNumbering, ({ personId, params, version, body }) =>
    proteins.setOffsetNumbering(personId, params.projectId, params.proteinId, version, body),
  );
}
