import { subject as subjectSchema, threads, type Subject } from '../../../shared/contracts';
import type { Routes } from '../../http';
import { notFound } from '../../lib/problem';
import type { ProjectAccess } from '../projects';
import type { ThreadQueries } from './thread.queries';
import type { ThreadService } from './thread.service';

/** The text form of a subject, back again. */
function subjectFromKey(key: string): Subject {
  const found = /^(residue):([^:]+):(\d{1,9})$|^(annotation|mutant|structure):([^:]+)$/.exec(key);
  const parsed = subjectSchema.safeParse(
    found?.[1]
      ? { kind: found[1], proteinId: found[2], residueIndex: Number(found[3]) }
      : { kind: found?.[4], id: found?.[5] },
  );
  if (!parsed.success) throw notFound('subject');
  return parsed.data;
}

export function addThreadRoutes(
  routes: Routes,
  projects: ProjectAccess,
  service: ThreadService,
  queries: ThreadQueries,
): void {
  routes.add(threads.list, async ({ personId, params, query }) => {
    await projects.may(personId, params.projectId, 'read project');
    return queries.list(params.projectId, query.before, query.limit);
  });
  routes.add(threads.ofSubject, async ({ personId, params, query }) => {
    await projects.may(personId, params.projectId, 'read project');
    return queries.ofSubject(params.projectId, subjectFromKey(params.subjectKey), query.before, query.limit);
  });
  routes.add(threads.post, ({ personId, params, body }) => service.post(personId, params.projectId, body));
}
