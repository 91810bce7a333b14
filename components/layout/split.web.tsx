import { Fragment } from 'react';
import { Group, Panel, Separator, useDefaultLayout, type LayoutStorage } from 'react-resizable-panels';
import { measure } from '@/components/theme';
import { Pane } from './pane';
import type { SplitProps } from './split';

/** Storage may be switched off: then the widths hold as long as the page. */
const storage: LayoutStorage = {
  getItem: (key) => {
    try {
      return globalThis.localStorage?.getItem(key) ?? null;
    } catch {
      return null;
    }
  },
  setItem: (key, value) => {
    try {
      globalThis.localStorage?.setItem(key, value);
    } catch {
      // nothing to keep it in
    }
  },
};

/** Panes beside one another, with separators that the pointer drags and the arrow keys move. */
export default function Split({ name, panes }: SplitProps) {
  const panelIds = panes.map((pane) => pane.key);
  const { defaultLayout, onLayoutChanged } = useDefaultLayout({
    id: `locant.panes.${name}`,
    panelIds,
    storage,
    onlySaveAfterUserInteractions: true,
  });
  return (
    <Group
      orientation="horizontal"
      defaultLayout={defaultLayout}
      onLayoutChanged={onLayoutChanged}
      style={{ height: '100%' }}
    >
      {panes.map((pane, place) => (
        <Fragment key={pane.key}>
          {place === 0 ? null : (
            <Separator className="separator" aria-label={`Width of ${panes[place - 1]?.label ?? 'pane'}`} />
          )}
          <Panel
            id={pane.key}
            minSize={measure.paneMin}
            defaultSize={pane.widthPixels}
            groupResizeBehavior={pane.widthPixels ? 'preserve-pixel-size' : 'preserve-relative-size'}
          >
            <Pane label={pane.label} flat={pane.flat}>
              {pane.content}
            </Pane>
          </Panel>
        </Fragment>
      ))}
    </Group>
  );
}
