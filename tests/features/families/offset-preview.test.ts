import { offsetForFirst, offsetOf, placeOfOne, previewOffset } from '@/features/families/offset-preview';
import type { Numbering } from '@/shared/contracts/families';
import { offsetNumbering } from '@/shared/sequence/numbering/numbering';

const residues = 'MKTAYIAKQRQISFVKSHFS';
const stored = (length: number, offset: number, skipZero: boolean): Numbering => ({
  id: '00000000-0000-4000-8000-000000000000',
  name: 'mature',
  kind: 'offset',
  segments: offsetNumbering(length, offset, { skipZero }).segments.map((segment) => ({ ...segment })),
});

it('turns the first residue of the mature chain into an offset and back', () => {
  expect(offsetForFirst(11)).toBe(-10);
  expect(placeOfOne(-10)).toBe(11);
});

it('shows what the ends, number 1 and the residue asked for become', () => {
  expect(previewOffset(residues, { offset: -10, skipZero: false }, 12)).toEqual([
    { what: 'first residue', place: 1, letter: 'M', label: '-9' },
    { what: 'number 1', place: 11, letter: 'Q', label: '1' },
    { what: 'asked for', place: 12, letter: 'I', label: '2' },
    { what: 'last residue', place: 20, letter: 'S', label: '10' },
  ]);
});

it('leaves zero out where older papers do', () => {
  const [first] = previewOffset(residues, { offset: -10, skipZero: true }, null);
  expect(first?.label).toBe('-10');
});

it('says nothing about a residue the sequence does not have', () => {
  const rows = previewOffset(residues, { offset: 12, skipZero: false }, 99);
  expect(rows.map(({ what, label }) => [what, label])).toEqual([
    ['first residue', '13'],
    ['last residue', '32'],
  ]);
});

it.each([
  [-10, false],
  [-10, true],
  [12, false],
  [-20, false],
  [-20, true],
  [-30, true],
  [0, false],
])('reads offset %d (zero left out: %s) back from what is stored', (offset, skipZero) => {
  const numbering = stored(20, offset, skipZero);
  const read = offsetOf(numbering);
  expect(read).not.toBeNull();
  if (read) expect(offsetNumbering(20, read.offset, read)).toEqual(offsetNumbering(20, offset, { skipZero }));
});

it('has no offset for a numbering of another kind', () => {
  expect(offsetOf({ ...stored(20, -10, false), kind: 'sequence' })).toBeNull();
});
