import { LessThan } from 'typeorm';
import { audit } from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';
import { AuditEntry } from '../../db/entities';
import type { Routes } from '../../http';
import type { PeopleDirectory } from '../auth';
import type { ProjectAccess } from '../projects';

/** Who did what: readable by every member, newest first. */
export function addAuditRoutes(
  routes: Routes,
  unitOfWork: UnitOfWork,
  projects: ProjectAccess,
  people: PeopleDirectory,
): void {
  routes.add(audit.list, async ({ personId, params, query }) => {
    await projects.may(personId, params.projectId, 'read project');
    const rows = await unitOfWork.reader.find(AuditEntry, {
      where: {
        projectId: params.projectId,
        ...(query.subjectKind && { subjectKind: query.subjectKind }),
        ...(query.subjectId && { subjectId: query.subjectId }),
        ...(query.before && { id: LessThan(String(query.before)) }),
      },
      order: { id: 'DESC' },
      take: query.limit + 1,
    });
    const page = rows.slice(0, query.limit);
    const brief = await people.briefs(page.map((row) => row.actorId));
    return {
      entries: page.map(({ id, action, subjectKind, subjectId, actorId, at, before, after }) => ({
        id,
        action,
        subjectKind,
        subjectId,
        by: brief(actorId),
        at: at.toISOString(),
        before,
        after,
      })),
      next: rows.length > query.limit ? Number(page.at(-1)?.id) : null,
    };
  });
}
