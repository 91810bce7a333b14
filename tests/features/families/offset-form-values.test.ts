import {
  bodyOf,
  offsetForm,
  offsetIn,
  ruleWords,
  storedRule,
  toldAs,
  valuesOf,
} from '@/features/families/offset-form-values';
import type { Protein } from '@/shared/contracts/families';
import { offsetNumbering } from '@/shared/sequence/numbering/numbering';

const values = { name: 'mature', way: 'one', number: '51', skipZero: false, preferred: true } as const;

it('makes the first residue of the mature chain number 1', () => {
  expect(bodyOf(values)).toEqual({ name: 'mature', offset: -50, skipZero: false, preferred: true });
});

it('takes an offset as it is, with any minus sign', () => {
  expect(offsetIn({ way: 'offset', number: '-50' })).toBe(-50);
  expect(offsetIn({ way: 'offset', number: '\u221250' })).toBe(-50);
  expect(offsetIn({ way: 'offset', number: '+12' })).toBe(12);
});

it('means the same when it is told the other way', () => {
  expect(toldAs('offset', values)).toBe('-50');
  expect(toldAs('one', { way: 'offset', number: '-50' })).toBe('51');
  expect(toldAs('one', { way: 'offset', number: 'x' })).toBe('x');
});

it.each(['', 'x', '1.5', '5e3', '1234567'])('asks for a whole number instead of "%s"', (number) => {
  expect(offsetForm.safeParse({ ...values, number }).success).toBe(false);
});

it('says a rule in words', () => {
  expect(ruleWords({ offset: -50, skipZero: true, preferred: false })).toBe(
    'sequence number minus 50, without zero, not preferred',
  );
});

const protein = (names: string[]): Protein => ({
  id: '00000000-0000-4000-8000-000000000001',
  familyId: '00000000-0000-4000-8000-000000000002',
  organism: 'Orvella tarda',
  name: 'c',
  length: 20,
  version: 3,
  residues: 'MKTAYIAKQRQISFVKSHFS',
  preferredNumbering: 'sequence',
  numberings: names.map((name) => ({
    id: '00000000-0000-4000-8000-000000000003',
    name,
    kind: 'offset',
    segments: offsetNumbering(20, -10).segments.map((segment) => ({ ...segment })),
  })),
});

it('starts from the numbering that is there', () => {
  const there = protein(['mature']);
  expect(valuesOf(there, there.numberings[0])).toEqual({
    name: 'mature',
    way: 'one',
    number: '11',
    skipZero: false,
    preferred: false,
  });
});

it('never offers a name under which something stands already', () => {
  expect(valuesOf(protein([]), undefined).name).toBe('mature');
  expect(valuesOf(protein(['mature']), undefined).name).toBe('');
});

it('says what stands under a name', () => {
  expect(storedRule(protein(['mature']), 'mature')).toBe('sequence number minus 10, not preferred');
  expect(storedRule(protein([]), 'mature')).toBe('no numbering of this name');
});
