import type { RequestHandler } from 'express';
import { uploads } from '../../../shared/contracts';
import type { Routes } from '../../http';
import { notFound } from '../../lib/problem';
import type { ProjectAccess } from '../projects';
import { fileOf } from './upload.form';
import type { UploadQueries } from './upload.queries';
import type { UploadService } from './upload.service';

export function addUploadRoutes(
  routes: Routes,
  projects: ProjectAccess,
  queries: UploadQueries,
  service: UploadService,
  receive: RequestHandler,
): void {
  // Asked before a byte of the file is taken.
  const mayUpload: RequestHandler = async (request, response, next) => {
    const params = uploads.make.params.safeParse(request.params);
    if (!params.success) throw notFound('project');
    await projects.may(String(response.locals.personId), params.data.projectId, 'upload');
    next();
  };
  routes.add(uploads.list, async ({ personId, params }) => {
    await projects.may(personId, params.projectId, 'read project');
    return queries.ofProject(params.projectId);
  });
  routes.add(
    uploads.make,
    ({ personId, params, body, request }) => service.make(personId, params.projectId, body, fileOf(request)),
    mayUpload,
    receive,
  );
  routes.add(uploads.read, async ({ personId, params }) => {
    await projects.may(personId, params.projectId, 'read project');
    return queries.read(params.projectId, params.uploadId);
  });
  routes.add(uploads.excerpt, async ({ personId, params, query }) => {
    await projects.may(personId, params.projectId, 'read project');
    return queries.excerpt(params.projectId, params.uploadId, query.line, query.column);
  });
}
