import type { ReactNode } from 'react';
import type { LayoutName } from '@/components/theme';

export interface PaneItem {
  key: string;
  label: string;
  content: ReactNode;
  /** Width in pixels it starts with; the one without takes what is left. */
  widthPixels?: number;
  flat?: boolean;
  /** Not shown where panes are stacked, because the phone reaches it another way. */
  hideWhenStacked?: boolean;
}

export interface PanePlan {
  /** Side by side, or below one another. */
  direction: 'beside' | 'below';
  shown: readonly PaneItem[];
  /** Panes that take turns in the first place, when there is no room for all. */
  turns: readonly PaneItem[];
}

/**
 * Which panes a window of this kind shows: all beside one another from 1280 pixels; two from 1000, the first two of
 * three taking turns in one place; below that, all that are wanted below one another.
 */
export function planPanes(panes: readonly PaneItem[], layout: LayoutName, turn?: string): PanePlan {
  if (layout === 'phone' || layout === 'two') {
    return { direction: 'below', shown: panes.filter((pane) => !pane.hideWhenStacked), turns: [] };
  }
  if (layout === 'three' || panes.length < 3) return { direction: 'beside', shown: panes, turns: [] };
  const turns = panes.slice(0, 2);
  // The middle pane is the one that was asked for; the first only helps to find it.
  const first = turns.find((pane) => pane.key === turn) ?? turns[1];
  return { direction: 'beside', shown: first ? [first, ...panes.slice(2)] : panes, turns };
}
