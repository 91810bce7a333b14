import { z } from 'zod';
import {
  givenName,
  id,
  indexFromZero,
  issue,
  moment,
  personBrief,
  projectParams,
  residueLabel,
  version,
} from './common';
import { endpoint } from './endpoint';

export const construct = z.object({
  id,
  name: z.string(),
  revisionId: id,
  bases: z.string(),
  circular: z.boolean(),
  /** First base of the coding part, from 0, and its length with the stop codon. */
  codingStart: indexFromZero,
  codingLength: z.int(),
  geneticCode: z.int(),
  encoded: z.string(),
  proteinId: id,
  familyId: id,
  family: z.string(),
  organism: z.string(),
  /** Codon (from 0) ↔ residue index, in runs. */
  segments: z.array(z.object({ codonStart: indexFromZero, proteinStart: indexFromZero, length: z.int() })),
  issues: z.array(issue),
  by: personBrief,
  at: moment,
  version,
});
export type Construct = z.infer<typeof construct>;

export const newConstructBody = z.strictObject({
  name: givenName,
  /** Pasted bases, plain or FASTA. */
  dna: z.string().min(1, 'Paste the DNA.').max(500_000, 'At most 500,000 characters.'),
  /** First base of the coding part, counted from 1. */
  codingStart: z.int().min(1, 'Count bases from 1.'),
  circular: z.boolean(),
  geneticCode: z.int(),
  proteinId: id,
});

export const check = z.object({
  /** Stable, `pair-rule-melting`. */
  name: z.string(),
  label: z.string(),
  /** Which primer it is about; null for the pair. */
  primer: z.string().nullable(),
  /** A missed limit puts the design last; an advice only weighs in the ranking. */
  severity: z.enum(['limit', 'advice']),
  passed: z.boolean(),
  value: z.number().nullable(),
  limit: z.string(),
  basis: z.string(),
});
export const primer = z.object({
  name: z.string(),
  /** 5′→3′. */
  bases: z.string(),
  strand: z.enum(['+', '-']),
  /** Lowest base it covers in the construct, from 0. */
  start: indexFromZero,
  length: z.int(),
  gcPercent: z.number(),
  meltingCelsius: z.number().nullable(),
  annealingCelsius: z.number().nullable(),
  hairpinKcalPerMol: z.number(),
  selfDimerKcalPerMol: z.number(),
  misprimingSites: z.int(),
});
export type Primer = z.infer<typeof primer>;
export const codonChange = z.object({
  residue: residueLabel,
  codonStart: indexFromZero,
  codonFrom: z.string(),
  codonTo: z.string(),
  changedBases: z.int(),
  /** Share of the new codon among its synonyms in the host, 0 to 1. */
  hostShare: z.number().nullable(),
  chosenBy: z.enum(['host', 'fewest', 'both']),
});
export const design = z.object({
  id,
  scheme: z.literal('complementary-pair'),
  rank: z.int(),
  primers: z.array(primer),
  codons: z.array(codonChange),
  checks: z.array(check),
  reasons: z.array(z.string()),
  withinLimits: z.boolean(),
  /** The product DNA was built from the primers, translated, and encodes the asked change and no other. */
  proved: z.boolean(),
  proof: z.string(),
  chosen: z.boolean(),
});
export type Design = z.infer<typeof design>;

export const mutantStates = [
  'planned',
  'designed',
  'ordered',
  'received',
  'cloned',
  'sequenced',
  'verified',
  'failed',
] as const;
export const mutation = z.object({ residue: residueLabel, oldResidues: z.string(), newResidues: z.string() });
export const mutant = z.object({
  id,
  name: z.string(),
  constructId: id.nullable(),
  constructName: z.string().nullable(),
  state: z.enum(mutantStates),
  reason: z.string(),
  mutations: z.array(mutation),
  designs: z.array(design),
  by: personBrief,
  at: moment,
  version,
});
export type Mutant = z.infer<typeof mutant>;

export const newMutantBody = z.strictObject({
  proteinId: id,
  /** Changes as people write them in the protein's preferred numbering: `E62Q`, several joined by `+`. */
  changes: z.string().trim().min(1, 'Write a change, like E62Q.').max(200, 'At most 200 characters.'),
  constructId: id.nullable(),
  reason: z.string().trim().max(2000, 'At most 2,000 characters.'),
});
export const designBody = z.strictObject({
  constructId: id,
  /** Whose codon usage chooses the new codon. */
  host: z.enum(['ecoli', 'yeast']),
});
const mutantParams = z.strictObject({ projectId: id, mutantId: id });

export const plans = {
  constructs: endpoint({
    name: 'plans.constructs',
    method: 'GET',
    path: '/projects/:projectId/constructs',
    params: projectParams,
    reply: z.array(construct),
  }),
  makeConstruct: endpoint({
    name: 'plans.makeConstruct',
    method: 'POST',
    path: '/projects/:projectId/constructs',
    params: projectParams,
    body: newConstructBody,
    reply: construct,
  }),
  mutants: endpoint({
    name: 'plans.mutants',
    method: 'GET',
    path: '/projects/:projectId/mutants',
    params: projectParams,
    query: z.strictObject({
      proteinId: id.optional(),
      residueIndex: z.coerce.number().int().min(0).optional(),
    }),
    reply: z.array(mutant),
  }),
  mutant: endpoint({
    name: 'plans.mutant',
    method: 'GET',
    path: '/projects/:projectId/mutants/:mutantId',
    params: mutantParams,
    reply: mutant,
  }),
  makeMutant: endpoint({
    name: 'plans.makeMutant',
    method: 'POST',
    path: '/projects/:projectId/mutants',
    params: projectParams,
    body: newMutantBody,
    reply: mutant,
  }),
  design: endpoint({
    name: 'plans.design',
    method: 'POST',
    path: '/projects/:projectId/mutants/:mutantId/designs',
    params: mutantParams,
    versioned: true,
    status: 200,
    body: designBody,
    reply: mutant,
  }),
  choose: endpoint({
    name: 'plans.choose',
    method: 'PUT',
    path: '/projects/:projectId/mutants/:mutantId/chosen-design',
    params: mutantParams,
    versioned: true,
    body: z.strictObject({ designId: id }),
    reply: mutant,
  }),
  primerList: endpoint({
    name: 'plans.primerList',
    method: 'GET',
    path: '/projects/:projectId/primers.csv',
    params: projectParams,
    replyType: 'csv',
    reply: z.string(),
  }),
};

export const planEvents = { 'construct.changed': construct, 'mutant.changed': mutant };
