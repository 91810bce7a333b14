import { z } from 'zod';
import { offsetNumberingBody, type Numbering, type Protein } from '@/shared/contracts/families';
import { offsetForFirst, offsetOf, placeOfOne } from './offset-preview';

export type OffsetBody = z.infer<typeof offsetNumberingBody>;

const whole = /^[-+\u2212]?\d{1,6}$/;
const wholeNumber = (text: string): number | null =>
  whole.test(text.trim()) ? Number(text.trim().replace('\u2212', '-')) : null;

/** As it is filled in: the number means the place of number 1, or the offset. */
export const offsetForm = z.object({
  name: offsetNumberingBody.shape.name,
  way: z.enum(['one', 'offset']),
  number: z
    .string()
    .refine((text) => wholeNumber(text) !== null, 'Write a whole number, such as 51 or -50.')
    .refine((text) => Math.abs(wholeNumber(text) ?? 0) <= 99_999, 'At most 99999.'),
  skipZero: z.boolean(),
  preferred: z.boolean(),
});
export type OffsetValues = z.infer<typeof offsetForm>;
export type OffsetWay = OffsetValues['way'];

/** The offset of what is filled in, or null while it is no number. */
export function offsetIn({ way, number }: Pick<OffsetValues, 'way' | 'number'>): number | null {
  const value = wholeNumber(number);
  if (value === null) return null;
  return way === 'one' ? offsetForFirst(value) : value;
}

/** The same rule told the other way, so that switching changes nothing. */
export function toldAs(way: OffsetWay, values: Pick<OffsetValues, 'way' | 'number'>): string {
  const offset = offsetIn(values);
  if (offset === null) return values.number;
  return String(way === 'one' ? placeOfOne(offset) : offset);
}

const usualName = 'mature';

/** What the form starts with: a numbering that an offset made, or a new one. */
export function valuesOf(protein: Protein, numbering: Numbering | undefined): OffsetValues {
  const known = numbering ? offsetOf(numbering) : null;
  if (!numbering || !known) {
    const isTaken = protein.numberings.some(({ name }) => name === usualName);
    const name = isTaken ? '' : usualName;
    return { name, way: 'one', number: '1', skipZero: false, preferred: !isTaken };
  }
  return {
    name: numbering.name,
    way: 'one',
    number: String(placeOfOne(known.offset)),
    skipZero: known.skipZero,
    preferred: numbering.name === protein.preferredNumbering,
  };
}

export const bodyOf = (values: OffsetValues): OffsetBody => ({
  name: values.name,
  offset: offsetIn(values) ?? 0,
  skipZero: values.skipZero,
  preferred: values.preferred,
});

/** A numbering's rule in words, for two that differ. */
export const ruleWords = ({ offset, skipZero, preferred }: Omit<OffsetBody, 'name'>): string =>
  [
    `sequence number ${offset < 0 ? 'minus' : 'plus'} ${Math.abs(offset)}`,
    skipZero ? 'without zero' : '',
    preferred ? 'preferred' : 'not preferred',
  ]
    .filter(Boolean)
    .join(', ');

/** What a protein has under a name now. */
export function storedRule(protein: Protein, name: string): string {
  const numbering = protein.numberings.find((one) => one.name === name);
  const known = numbering ? offsetOf(numbering) : null;
  if (!known) return 'no numbering of this name';
  return ruleWords({ ...known, preferred: protein.preferredNumbering === name });
}
