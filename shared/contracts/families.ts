import { z } from 'zod';
import { givenName, id, indexFromZero, projectParams, version } from './common';
import { endpoint } from './endpoint';

export const part = z.enum(['rotor', 'stator', 'head', 'stalk', 'other']);
export type Part = z.infer<typeof part>;

export const family = z.object({
  id,
  name: z.string(),
  /** Other spellings the locator takes, `beta` for `β`. */
  aliases: z.array(z.string()),
  /** What it is in the motor, in two or three words. */
  description: z.string(),
  part,
  catalytic: z.boolean(),
  sort: z.int(),
  proteinCount: z.int(),
  referenceAlignmentId: id.nullable(),
  version,
});
export type Family = z.infer<typeof family>;

export const familyName = givenName
  .max(12, 'At most 12 characters.')
  .regex(/^[\p{L}][\p{L}\p{N}'′″]*$/u, 'A family name is letters, then digits or primes, without spaces.');
export const newFamilyBody = z.strictObject({
  name: familyName,
  aliases: z.array(familyName).max(8),
  part,
  catalytic: z.boolean(),
});

/** Labels of a run of residues: `firstNumber`, counting up, each with `suffix` behind it. */
export const numberingSegment = z.object({
  residueIndex: indexFromZero,
  length: z.int().min(1),
  firstNumber: z.int(),
  suffix: z.string(),
});
export const numbering = z.object({
  id,
  name: z.string(),
  kind: z.enum(['sequence', 'offset', 'reference', 'author', 'construct', 'table']),
  segments: z.array(numberingSegment),
});
export type Numbering = z.infer<typeof numbering>;

export const proteinBrief = z.object({
  id,
  familyId: id,
  organism: z.string(),
  name: z.string(),
  length: z.int(),
  version,
});
export type ProteinBrief = z.infer<typeof proteinBrief>;
export const protein = proteinBrief.extend({
  residues: z.string(),
  numberings: z.array(numbering),
  preferredNumbering: z.string(),
});
export type Protein = z.infer<typeof protein>;

/** `label = index from 1 + offset`; without a zero the labels run …, -1, 1, … as older papers write them. */
export const offsetNumberingBody = z.strictObject({
  name: givenName.max(40),
  offset: z.int().min(-100000).max(100000),
  skipZero: z.boolean(),
  /** Show this numbering first. */
  preferred: z.boolean(),
});
export const proteinParams = z.strictObject({ projectId: id, proteinId: id });

export const families = {
  list: endpoint({
    name: 'families.list',
    method: 'GET',
    path: '/projects/:projectId/families',
    params: projectParams,
    reply: z.array(family),
  }),
  make: endpoint({
    name: 'families.make',
    method: 'POST',
    path: '/projects/:projectId/families',
    params: projectParams,
    body: newFamilyBody,
    reply: family,
  }),
  proteins: endpoint({
    name: 'families.proteins',
    method: 'GET',
    path: '/projects/:projectId/families/:familyId/proteins',
    params: z.strictObject({ projectId: id, familyId: id }),
    reply: z.array(proteinBrief),
  }),
  protein: endpoint({
    name: 'families.protein',
    method: 'GET',
    path: '/projects/:projectId/proteins/:proteinId',
    params: proteinParams,
    reply: protein,
  }),
  renameProtein: endpoint({
    name: 'families.renameProtein',
    method: 'PATCH',
    path: '/projects/:projectId/proteins/:proteinId',
    params: proteinParams,
    versioned: true,
    body: z.strictObject({ organism: givenName }),
    reply: protein,
  }),
  setOffsetNumbering: endpoint({
    name: 'families.setOffsetNumbering',
    method: 'PUT',
    path: '/projects/:projectId/proteins/:proteinId/offset-numbering',
    params: proteinParams,
    versioned: true,
    body: offsetNumberingBody,
    reply: protein,
  }),
};

export const familyEvents = {
  'family.changed': family,
  'protein.changed': protein,
};
