import { z } from 'zod';
import { id, issue, moment, personBrief, projectParams, version } from './common';
import { endpoint } from './endpoint';

export const alignment = z.object({
  id,
  familyId: id,
  name: z.string(),
  isReference: z.boolean(),
  revisionId: id,
  revision: z.int(),
  format: z.string(),
  rowCount: z.int(),
  columnCount: z.int(),
  fileName: z.string(),
  issues: z.array(issue),
  by: personBrief,
  at: moment,
  version,
});
export type Alignment = z.infer<typeof alignment>;

export const alignmentRow = z.object({
  rowIndex: z.int(),
  name: z.string(),
  proteinId: id,
  organism: z.string(),
  text: z.string(),
});

export const alignments = {
  list: endpoint({
    name: 'alignments.list',
    method: 'GET',
    path: '/projects/:projectId/alignments',
    params: projectParams,
    reply: z.array(alignment),
  }),
  read: endpoint({
    name: 'alignments.read',
    method: 'GET',
    path: '/projects/:projectId/alignments/:alignmentId',
    params: z.strictObject({ projectId: id, alignmentId: id }),
    reply: alignment.extend({ rows: z.array(alignmentRow) }),
  }),
};

export const alignmentEvents = { 'alignment.changed': alignment };
