import { color } from '@/components/theme';
import { Pane } from './pane';
import type { PaneItem } from './pane-plan';

export interface SplitProps {
  /** Name under which the widths are kept in this browser. */
  name: string;
  panes: readonly PaneItem[];
}

/** Panes beside one another at fixed widths, where nothing can be dragged. */
export default function Split({ panes }: SplitProps) {
  return (
    <div style={{ display: 'flex', height: '100%', minHeight: 0 }}>
      {panes.map((pane, place) => (
        <div
          key={pane.key}
          style={{
            flex: pane.widthPixels ? `0 0 ${pane.widthPixels}px` : 1,
            minWidth: 0,
            borderLeft: place === 0 ? undefined : `1px solid ${color.lineRule}`,
          }}
        >
          <Pane label={pane.label} flat={pane.flat}>
            {pane.content}
          </Pane>
        </div>
      ))}
    </div>
  );
}
