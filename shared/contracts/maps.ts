import { z } from 'zod';
import { givenName, id, indexFromZero, personBrief, version } from './common';
import { endpoint } from './endpoint';

export const mapStatus = z.enum(['proposed', 'confirmed', 'corrected', 'left out']);

/** A chain residue that differs from, or is doubtful against, the protein residue it is mapped to. */
export const mapException = z.object({
  kind: z.enum(['mismatch', 'engineered', 'tag', 'insertion', 'ambiguous', 'modified', 'undetermined']),
  label: z.string(),
  chainLetter: z.string(),
  residueIndex: indexFromZero.nullable(),
  proteinLetter: z.string().nullable(),
  message: z.string(),
});

export const mapCandidate = z.object({
  proteinId: id,
  familyId: id,
  family: z.string(),
  organism: z.string(),
  identity: z.number(),
  coverage: z.number(),
});

export const mapSegment = z.object({
  chainStart: indexFromZero,
  proteinStart: indexFromZero,
  length: z.int().min(1),
});

/** One chain of a structure, what it was matched to, and what a curator said. */
export const chainMap = z.object({
  chainId: id,
  structureId: id,
  authorId: z.string(),
  labelIds: z.array(z.string()),
  kind: z.enum(['protein', 'nucleic', 'other']),
  observedLength: z.int(),
  declaredLength: z.int().nullable(),
  /** Equal for chains whose declared and seen sequences are equal, and for no others. */
  sequenceKey: z.string(),
  missingCount: z.int(),
  firstLabel: z.string(),
  lastLabel: z.string(),
  /** Null for a chain that is not a protein. */
  status: mapStatus.nullable(),
  /** `ready` can be confirmed as it is; `look` has exceptions; `choose` needs a person's choice. */
  readiness: z.enum(['ready', 'look', 'choose', 'none']),
  /** Why this proposal, or why there is none, in words. */
  reason: z.string(),
  familyId: id.nullable(),
  proteinId: id.nullable(),
  organism: z.string().nullable(),
  /** Identical ÷ aligned pairs, and aligned pairs ÷ observed residues; 0 to 1. */
  identity: z.number().nullable(),
  coverage: z.number().nullable(),
  proteinLength: z.int().nullable(),
  segments: z.array(mapSegment),
  exceptions: z.array(mapException),
  candidates: z.array(mapCandidate),
  decidedBy: personBrief.nullable(),
  version,
});
export type ChainMap = z.infer<typeof chainMap>;

export const mapDecisionBody = z.discriminatedUnion('decision', [
  z.strictObject({ decision: z.literal('confirm') }),
  z.strictObject({ decision: z.literal('correct'), proteinId: id }),
  z.strictObject({ decision: z.literal('add protein'), familyId: id, organism: givenName }),
  z.strictObject({ decision: z.literal('leave out') }),
]);

export const maps = {
  decide: endpoint({
    name: 'maps.decide',
    method: 'PUT',
    path: '/projects/:projectId/chains/:chainId/map',
    params: z.strictObject({ projectId: id, chainId: id }),
    versioned: true,
    body: mapDecisionBody,
    reply: chainMap,
  }),
  confirmReady: endpoint({
    name: 'maps.confirmReady',
    method: 'POST',
    path: '/projects/:projectId/structures/:structureId/confirm-ready',
    params: z.strictObject({ projectId: id, structureId: id }),
    status: 200,
    reply: z.array(chainMap),
  }),
};

export const mapEvents = { 'map.decided': chainMap };
