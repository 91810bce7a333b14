import { z } from 'zod';
import { id, issue, moment, personBrief, projectParams, version } from './common';
import { endpoint } from './endpoint';
import { chainMap } from './maps';

export const structure = z.object({
  id,
  name: z.string(),
  revisionId: id,
  revision: z.int(),
  format: z.string(),
  title: z.string(),
  modelCount: z.int(),
  chainCount: z.int(),
  atomCount: z.int(),
  /** Protein chains whose map still waits for a curator. */
  waiting: z.int(),
  fileName: z.string(),
  issues: z.array(issue),
  by: personBrief,
  at: moment,
  version,
});
export type Structure = z.infer<typeof structure>;
export const structureWithChains = structure.extend({ chains: z.array(chainMap) });
export type StructureWithChains = z.infer<typeof structureWithChains>;

export const structures = {
  list: endpoint({
    name: 'structures.list',
    method: 'GET',
    path: '/projects/:projectId/structures',
    params: projectParams,
    reply: z.array(structure),
  }),
  read: endpoint({
    name: 'structures.read',
    method: 'GET',
    path: '/projects/:projectId/structures/:structureId',
    params: z.strictObject({ projectId: id, structureId: id }),
    reply: structureWithChains,
  }),
};

export const structureEvents = { 'structure.changed': structure };
