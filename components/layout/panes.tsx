import { lazy, Suspense, useState } from 'react';
import { color, useLayout } from '@/components/theme';
import { Tabs } from '@/components/ui';
import { Pane } from './pane';
import { planPanes, type PaneItem } from './pane-plan';

export interface PanesProps {
  /** Name under which the widths are kept in this browser: residue, thread. */
  name: string;
  /** Up to three, from left to right. */
  panes: readonly PaneItem[];
}

// A phone never needs the separators, so they are loaded by wide screens only.
const Split = lazy(() => import('./split'));

/** Three panes from 1280 pixels, two from 1000, below one another on less. */
export function Panes({ name, panes }: PanesProps) {
  const layout = useLayout();
  const [turn, setTurn] = useState<string>();
  const plan = planPanes(panes, layout.name, turn);
  if (plan.direction === 'below') {
    return (
      <div className="frame" style={{ flex: 1, minHeight: 0, overflowY: 'auto' }}>
        {plan.shown.map((pane, place) => (
          <div key={pane.key} style={place === 0 ? undefined : { borderTop: `1px solid ${color.lineRule}` }}>
            <Pane label={pane.label} flat={pane.flat} stacked>
              {pane.content}
            </Pane>
          </div>
        ))}
      </div>
    );
  }
  const first = plan.shown[0];
  return (
    <div className="frame" style={{ flex: 1, minHeight: 0, display: 'flex', flexDirection: 'column' }}>
      {plan.turns.length > 0 && first ? (
        <Tabs
          label="What the first pane shows"
          items={plan.turns.map(({ key, label }) => ({ key, label }))}
          current={first.key}
          onChange={setTurn}
        />
      ) : null}
      <div className="frame" style={{ flex: 1, minHeight: 0 }}>
        <Suspense fallback={null}>
          <Split key={plan.shown.map((pane) => pane.key).join('+')} name={name} panes={plan.shown} />
        </Suspense>
      </div>
    </div>
  );
}
