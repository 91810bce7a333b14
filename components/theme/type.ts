import type { TextStyle } from 'react-native';

export type TextKind = 'meta' | 'small' | 'body' | 'lead' | 'head' | 'title' | 'plate';

export const face = { text: 'var(--face-text)', mono: 'var(--face-mono)' } as const;

/** React Native types sizes as numbers; on the web a variable is as good, and follows the window without a redraw. */
const variable = (name: string): number => `var(${name})` as unknown as number;

/** Sizes 12, 14, 16, 20, 28 and 40. `body` is 16 on a phone and 14 on a wide screen; `lead` stays 16. */
export const typeScale: Record<TextKind, TextStyle> = {
  meta: { fontSize: 12, lineHeight: 16, fontWeight: '400' },
  small: { fontSize: 14, lineHeight: 20, fontWeight: '400' },
  body: { fontSize: variable('--body-size'), lineHeight: variable('--body-line'), fontWeight: '400' },
  lead: { fontSize: 16, lineHeight: 24, fontWeight: '400' },
  head: { fontSize: 20, lineHeight: 26, fontWeight: '600' },
  title: { fontSize: 28, lineHeight: 34, fontWeight: '600' },
  plate: { fontSize: 40, lineHeight: 44, fontWeight: '700' },
};
