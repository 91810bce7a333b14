import { z } from 'zod';
import { id, indexFromZero, projectParams, residueLabel } from './common';
import { endpoint } from './endpoint';

export const grade = z.enum(['strong', 'good', 'fair', 'weak', 'none']);

export const equivalent = residueLabel.extend({
  grade,
  /** How the letters relate: same, similar, other. */
  letterRelation: z.enum(['same', 'similar', 'other']),
});
export const gapRow = z.object({ proteinId: id, organism: z.string(), rowName: z.string() });

export const copyState = z.enum(['observed', 'missing', 'alternates']);
export const chainCopy = z.object({
  structureId: id,
  structureName: z.string(),
  chainId: id,
  authorId: z.string(),
  /** Author number with insertion code; null where the residue has no coordinates. */
  label: z.string().nullable(),
  /** Letter in the coordinate file; it may differ from the protein's. */
  letter: z.string().nullable(),
  state: copyState,
  confirmed: z.boolean(),
  engineered: z.boolean(),
});

/** Everything a residue is called. */
export const passport = z.object({
  residue: residueLabel,
  proteinName: z.string(),
  proteinLength: z.int(),
  familyVersion: z.int(),
  labels: z.array(
    z.object({
      numbering: z.string(),
      kind: z.string(),
      preferred: z.boolean(),
      label: z.string().nullable(),
    }),
  ),
  /** Where it stands in the family's reference alignment; null when it is in no row. */
  column: z
    .object({
      alignmentId: id,
      alignmentName: z.string(),
      revision: z.int(),
      column: indexFromZero,
      rowCount: z.int(),
      gapCount: z.int(),
      shares: z.array(z.object({ letter: z.string(), count: z.int(), organisms: z.array(z.string()) })),
    })
    .nullable(),
  equivalents: z.array(equivalent),
  gaps: z.array(gapRow),
  copies: z.array(chainCopy),
  previous: residueLabel.nullable(),
  next: residueLabel.nullable(),
  /** Indices of this protein's residues that carry a pin, for the scale. */
  pinnedIndices: z.array(indexFromZero),
});
export type Passport = z.infer<typeof passport>;
export type Equivalent = z.infer<typeof equivalent>;
export type ChainCopy = z.infer<typeof chainCopy>;

/** One thing the typed text can mean. Doubtful ones are listed, never guessed. */
export const reading = z.object({
  residue: residueLabel,
  /** Heading of the group it stands in. */
  group: z.string(),
  /** The spelling that leaves only this group. */
  spelling: z.string(),
  reason: z.string(),
  /** The letter typed is not the one that stands there: `says Glu, is Asp`. */
  mismatch: z.string().nullable(),
  /** The change when a mutation was typed. */
  mutationTo: z.string().nullable(),
  pinCount: z.int(),
});
export type Reading = z.infer<typeof reading>;
export const locateReply = z.object({
  text: z.string(),
  readings: z.array(reading),
  notReadAs: z.array(z.string()),
  /** There are more readings than are listed. */
  more: z.boolean(),
});
export type LocateReply = z.infer<typeof locateReply>;

export const residueParams = z.strictObject({
  projectId: id,
  proteinId: id,
  residueIndex: z.coerce.number().int().min(0),
});

export const residues = {
  locate: endpoint({
    name: 'residues.locate',
    method: 'GET',
    path: '/projects/:projectId/locate',
    params: projectParams,
    query: z.strictObject({ text: z.string().max(200, 'An address has at most 200 characters.') }),
    reply: locateReply,
  }),
  passport: endpoint({
    name: 'residues.passport',
    method: 'GET',
    path: '/projects/:projectId/residues/:proteinId/:residueIndex',
    params: residueParams,
    reply: passport,
  }),
};
