import { z } from 'zod';
import { moment, personBrief, projectParams } from './common';
import { endpoint } from './endpoint';

export const auditEntry = z.object({
  id: z.string(),
  action: z.string(),
  subjectKind: z.string(),
  subjectId: z.string(),
  by: personBrief,
  at: moment,
  before: z.unknown(),
  after: z.unknown(),
});
export type AuditEntry = z.infer<typeof auditEntry>;

/** Kinds and ids are plain letters: the database cannot compare others with them. */
const word = (longest: number) =>
  z
    .string()
    .max(longest)
    .regex(/^[\x20-\x7e]*$/, 'Plain letters, digits and signs.');

export const audit = {
  list: endpoint({
    name: 'audit.list',
    method: 'GET',
    path: '/projects/:projectId/audit',
    params: projectParams,
    query: z.strictObject({
      subjectKind: word(40).optional(),
      subjectId: word(120).optional(),
      before: z.coerce.number().int().min(1).optional(),
      limit: z.coerce.number().int().min(1).max(100).default(50),
    }),
    reply: z.object({ entries: z.array(auditEntry), next: z.int().nullable() }),
  }),
};
