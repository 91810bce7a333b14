import type { CSSProperties } from 'react';
import { color, face } from '@/components/theme';

/** The frame of what is filled in: 16 px wherever there is touch, since a smaller one makes phones zoom in. */
export const controlStyle = (hasError: boolean, mono = false): CSSProperties => ({
  display: 'block',
  width: '100%',
  minWidth: 0,
  minHeight: 'var(--hit)',
  padding: '8px 12px',
  border: hasError ? `2px solid ${color.danger}` : `1.5px solid ${color.lineControl}`,
  borderRadius: 4,
  background: color.raised,
  color: color.ink,
  font: `400 var(--control-size)/24px ${mono ? face.mono : face.text}`,
});
