import { z } from 'zod';
import './plain-words';

/** In lower case, so that one thing has one id wherever ids are compared as text. */
export const id = z.uuid().toLowerCase();
export const moment = z.iso.datetime();
/** A name people give: something visible, at most 120 characters, on one line. */
export const givenName = z
  .string()
  .trim()
  .min(1, 'Write a name.')
  .max(120, 'At most 120 characters.')
  .regex(/^[^\p{Cc}\u2028\u2029]*$/u, 'A name is one line without control characters.')
  // Signs that turn the writing direction would let a name look like another one.
  .regex(/^[^\u202a-\u202e\u2066-\u2069]*$/u, 'A name is without signs that turn the writing direction.')
  .regex(/[\p{L}\p{N}\p{P}\p{S}]|^$/u, 'Write a name that can be seen.');
export const version = z.int().min(1);
export const eventNumber = z.int().min(0);
export const indexFromZero = z.int().min(0);
export const projectParams = z.strictObject({ projectId: id });

export const personBrief = z.object({ id, name: z.string() });
export type PersonBrief = z.infer<typeof personBrief>;

export const issue = z.object({
  code: z.string(),
  severity: z.enum(['error', 'warning']),
  line: z.number().optional(),
  column: z.number().optional(),
  chain: z.string().optional(),
  residue: z.string().optional(),
  message: z.string(),
});

/** Every refusal, RFC 9457 with our own members: what happened, where, and what to do. */
export const problem = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number(),
  code: z.string(),
  detail: z.string(),
  requestId: z.string(),
  /** Which field of the request, dotted. */
  fields: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
  issues: z.array(issue).optional(),
  /** What stands there now, when somebody else changed it first. */
  current: z.unknown().optional(),
});
export type Problem = z.infer<typeof problem>;

/** A residue as the plate shows it: which family and part, which letter, which label in which numbering. */
export const residueLabel = z.object({
  proteinId: id,
  residueIndex: indexFromZero,
  familyId: id,
  family: z.string(),
  part: z.enum(['rotor', 'stator', 'head', 'stalk', 'other']),
  organism: z.string(),
  letter: z.string(),
  label: z.string(),
  numbering: z.string(),
});
export type ResidueLabel = z.infer<typeof residueLabel>;
export const residueRef = z.strictObject({ proteinId: id, residueIndex: indexFromZero });
export type ResidueRef = z.infer<typeof residueRef>;
