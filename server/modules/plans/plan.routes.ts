import { plans } from '../../../shared/contracts';
import type { Routes } from '../../http';
import { notFound } from '../../lib/problem';
import type { ProjectAccess } from '../projects';
import type { ConstructService } from './construct.service';
import type { MutantService } from './mutant.service';
import type { PlanAccess } from './plan.access';
import type { PlanQueries } from './plan.queries';
import { primerListCsv } from './primer-list';

interface Parts {
  projects: ProjectAccess;
  access: PlanAccess;
  constructs: ConstructService;
  mutants: MutantService;
  queries: PlanQueries;
}

export function addPlanRoutes(
  routes: Routes,
  { projects, access, constructs, mutants, queries }: Parts,
): void {
  routes.add(plans.constructs, async ({ personId, params }) => {
    await projects.may(personId, params.projectId, 'read project');
    return queries.constructs(params.projectId);
  });
  routes.add(plans.makeConstruct, ({ personId, params, body }) =>
    constructs.make(personId, params.projectId, body),
  );
  routes.add(plans.mutants, async ({ personId, params, query }) => {
    await projects.may(personId, params.projectId, 'read project');
    return queries.mutants(params.projectId, query);
  });
  routes.add(plans.mutant, async ({ personId, params }) => {
    const mutant = await access.mutant(personId, params.projectId, params.mutantId);
    const [presented] = await queries.presentMutants([mutant]);
    if (!presented) throw notFound('mutant');
    return presented;
  });
  routes.add(plans.makeMutant, ({ personId, params, body }) =>
    mutants.make(personId, params.projectId, body),
  );
  routes.add(plans.design, ({ personId, params, version, body }) =>
    mutants.design(personId, params.projectId, params.mutantId, version, body),
  );
  routes.add(plans.choose, ({ personId, params, version, body }) =>
    mutants.choose(personId, params.projectId, params.mutantId, version, body.designId),
  );
  routes.add(plans.primerList, async ({ personId, params, response }) => {
    const { project } = await projects.may(personId, params.projectId, 'export');
    const csv = primerListCsv(await queries.allMutants(params.projectId), project.name, new Date());
    response.attachment('primers.csv');
    return csv;
  });
}
