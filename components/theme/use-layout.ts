import { useWindowDimensions } from 'react-native';

/** `phone` one column, `two` two columns, `wide` rail and two panes, `three` three panes. */
export type LayoutName = 'phone' | 'two' | 'wide' | 'three';

export function layoutForWidth(widthPixels: number): LayoutName {
  if (widthPixels < 700) return 'phone';
  if (widthPixels < 1000) return 'two';
  return widthPixels < 1280 ? 'wide' : 'three';
}

export interface Layout {
  name: LayoutName;
  /** The frame with a rail at the left and the title block below, from 1000 pixels. */
  hasRail: boolean;
  widthPixels: number;
}

export function useLayout(): Layout {
  const { width } = useWindowDimensions();
  const name = layoutForWidth(width);
  return { name, hasRail: name === 'wide' || name === 'three', widthPixels: width };
}
