import { z } from 'zod';
import { givenName, id, issue, moment, personBrief, projectParams, version } from './common';
import { endpoint } from './endpoint';

export const uploadKind = z.enum(['alignment', 'structure']);
export const uploadState = z.enum(['received', 'reading', 'waiting', 'done', 'refused']);

export const upload = z.object({
  id,
  kind: uploadKind,
  fileName: z.string(),
  bytes: z.int(),
  familyId: id.nullable(),
  state: uploadState,
  /** While it is reading: `read` or `map`, and how far; else empty. */
  stage: z.string(),
  done: z.int(),
  total: z.int(),
  issues: z.array(issue),
  /** The alignment or structure it became. */
  alignmentId: id.nullable(),
  structureId: id.nullable(),
  by: personBrief,
  at: moment,
  version,
});
export type Upload = z.infer<typeof upload>;

/** Fields beside the file in the form. An alignment names its family; a name is taken from the file when left out. */
export const newUploadBody = z.strictObject({
  kind: uploadKind,
  familyId: id.optional(),
  name: givenName.optional(),
});
const uploadParams = z.strictObject({ projectId: id, uploadId: id });

export const uploads = {
  list: endpoint({
    name: 'uploads.list',
    method: 'GET',
    path: '/projects/:projectId/uploads',
    params: projectParams,
    reply: z.array(upload),
  }),
  make: endpoint({
    name: 'uploads.make',
    method: 'POST',
    path: '/projects/:projectId/uploads',
    params: projectParams,
    encoding: 'form',
    body: newUploadBody,
    reply: upload,
  }),
  read: endpoint({
    name: 'uploads.read',
    method: 'GET',
    path: '/projects/:projectId/uploads/:uploadId',
    params: uploadParams,
    reply: upload,
  }),
  excerpt: endpoint({
    name: 'uploads.excerpt',
    method: 'GET',
    path: '/projects/:projectId/uploads/:uploadId/excerpt',
    params: uploadParams,
    /** From 1; a column far along a line moves what is shown of each line. */
    query: z.strictObject({
      line: z.coerce.number().int().min(1),
      column: z.coerce.number().int().min(1).optional(),
    }),
    reply: z.object({ firstLine: z.int(), firstColumn: z.int(), lines: z.array(z.string()) }),
  }),
};

export const uploadEvents = { 'upload.changed': upload };

/** A hint while a file is read, at most four a second; never stored, never counted. */
export const uploadProgress = z.object({ uploadId: id, stage: z.string(), done: z.int(), total: z.int() });
