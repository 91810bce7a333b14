import { bodyOf, offsetForm, offsetIn, ruleWords, toldAs } from '@/features/families/offset-form-values';

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
