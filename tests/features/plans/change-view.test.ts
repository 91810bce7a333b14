import { beginningOfChange, errorsOf, viewChange } from '@/features/plans/change-view';
import { buildProtein, worked } from './support';

const protein = buildProtein(worked.protein);

test('a change that fits names its residue', () => {
  const view = viewChange('D61N', protein);
  expect(view.issues).toEqual([]);
  expect(view.changes).toMatchObject([{ residueIndex: 60, label: '61', from: 'D', to: 'N' }]);
});

test('a letter that stands elsewhere: what stands there, and what would fit', () => {
  const view = viewChange('D59N', protein);
  expect(view.changes).toEqual([]);
  expect(errorsOf(view)).toContain('at 59 stands Leu (L), not Asp (D)');
  expect(view.suggestions).toContain('D61N');
});

test('labels are read in the preferred numbering', () => {
  const mature = buildProtein(worked.protein, 11);
  expect(viewChange('D71N', mature).changes).toMatchObject([{ residueIndex: 60, label: '71' }]);
  expect(beginningOfChange(mature, 60)).toBe('D71');
});

test.each(['D61', 'Asp61', '61'])('%s is a beginning, not a fault', (text) => {
  const view = viewChange(text, protein);
  expect(view.issues).toEqual([]);
  expect(view.unfinished).toMatchObject({ letter: 'D', label: '61' });
});

test('several mutants at once are refused with what to do', () => {
  expect(errorsOf(viewChange('D61N, E37Q', protein))).toContain('joined by +');
  expect(viewChange('D61N+E37Q', protein).changes).toHaveLength(2);
});

test.each(['<b>', 'D61*', 'E62fs', 'x'.repeat(10_000), '  '])('%p changes nothing', (text) => {
  expect(viewChange(text, protein).changes).toEqual([]);
});
