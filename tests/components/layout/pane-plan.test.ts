import { planPanes, type PaneItem } from '@/components/layout/pane-plan';

const pane = (key: string, more: Partial<PaneItem> = {}): PaneItem => ({
  key,
  label: key,
  content: null,
  ...more,
});
const panes = [pane('source', { hideWhenStacked: true }), pane('residue'), pane('thread')];
const keys = (list: readonly PaneItem[]): string[] => list.map(({ key }) => key);

test('three panes stand beside one another from 1280 pixels', () => {
  const plan = planPanes(panes, 'three');
  expect([plan.direction, keys(plan.shown), plan.turns.length]).toEqual([
    'beside',
    ['source', 'residue', 'thread'],
    0,
  ]);
});

test('on a narrower wide screen source and residue take turns, and nothing is unreachable', () => {
  const plan = planPanes(panes, 'wide');
  expect(keys(plan.shown)).toEqual(['residue', 'thread']);
  expect(keys(plan.turns)).toEqual(['source', 'residue']);
  expect(keys(planPanes(panes, 'wide', 'source').shown)).toEqual(['source', 'thread']);
});

test('two panes need no turns', () => {
  const plan = planPanes(panes.slice(1), 'wide');
  expect([keys(plan.shown), plan.turns.length]).toEqual([['residue', 'thread'], 0]);
});

test.each(['phone', 'two'] as const)(
  'on a %s screen they stand below one another, without those hidden there',
  (layout) => {
    const plan = planPanes(panes, layout);
    expect([plan.direction, keys(plan.shown)]).toEqual(['below', ['residue', 'thread']]);
  },
);
