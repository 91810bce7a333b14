import { annotations } from '../../../shared/contracts';
import type { Routes } from '../../http';
import type { ProteinDirectory } from '../families';
import type { ProjectAccess } from '../projects';
import type { AnnotationAccess } from './annotation.access';
import type { AnnotationQueries } from './annotation.queries';
import type { AnnotationService } from './annotation.service';

interface Parts {
  projects: ProjectAccess;
  access: AnnotationAccess;
  service: AnnotationService;
  queries: AnnotationQueries;
  proteins: ProteinDirectory;
}

export function addAnnotationRoutes(
  routes: Routes,
  { projects, access, service, queries, proteins }: Parts,
): void {
  routes.add(annotations.list, async ({ personId, params, query }) => {
    await projects.may(personId, params.projectId, 'read project');
    return queries.list(params.projectId, query.before, query.limit);
  });
  routes.add(annotations.atResidue, async ({ personId, params: { projectId, ...ref } }) => {
    await projects.may(personId, projectId, 'read project');
    await proteins.mustHoldResidues(projectId, [ref]);
    return queries.atResidue(projectId, ref);
  });
  routes.add(annotations.make, ({ personId, params, body }) =>
    service.make(personId, params.projectId, body),
  );
  routes.add(annotations.edit, ({ personId, params, version, body }) =>
    service.edit(personId, params.projectId, params.annotationId, version, body),
  );
  routes.add(annotations.setStatus, ({ personId, params, version, body }) =>
    service.setStatus(personId, params.projectId, params.annotationId, version, body),
  );
  routes.add(annotations.versions, async ({ personId, params }) => {
    const { annotation } = await access.seen(personId, params.projectId, params.annotationId);
    return queries.versions(annotation.id);
  });
}
