import type { ComponentType } from 'react';
import { toneColor, type Tone } from '@/components/theme';

/** What an icon module exports: take it from `lucide-react-native/icons/<name>`, one file an icon. */
export type IconShape = ComponentType<{ size?: number; color?: string; strokeWidth?: number }>;

export interface IconProps {
  of: IconShape;
  sizePixels?: number;
  tone?: Tone;
  /** Left out, the icon is decoration and stays silent. */
  label?: string;
}

export function Icon({ of: Shape, sizePixels = 20, tone = 'ink', label }: IconProps) {
  const spoken = label ? ({ role: 'img', 'aria-label': label } as const) : { 'aria-hidden': true };
  return (
    <span
      {...spoken}
      style={{
        display: 'inline-flex',
        flex: 'none',
        width: sizePixels,
        height: sizePixels,
        verticalAlign: -4,
      }}
    >
      <Shape size={sizePixels} color={toneColor[tone]} strokeWidth={1.75} />
    </span>
  );
}
