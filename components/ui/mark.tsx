import type { ReactNode } from 'react';
import CircleCheck from 'lucide-react-native/icons/circle-check';
import CircleX from 'lucide-react-native/icons/circle-x';
import TriangleAlert from 'lucide-react-native/icons/triangle-alert';
import { face, toneColor, type Tone } from '@/components/theme';
import { Icon, type IconShape } from './icon';

export interface MarkProps {
  children: ReactNode;
  tone?: Tone;
  icon?: IconShape;
}

const usual: Partial<Record<Tone, IconShape>> = { good: CircleCheck, warn: TriangleAlert, danger: CircleX };

/** An icon with a short word: ready, look at 1, choose. Coloured tones bring their icon with them. */
export function Mark({ children, tone = 'soft', icon = usual[tone] }: MarkProps) {
  return (
    <span
      style={{
        display: 'inline-flex',
        alignItems: 'center',
        gap: 5,
        font: `600 12px/16px ${face.text}`,
        color: toneColor[tone],
      }}
    >
      {icon ? <Icon of={icon} tone={tone} sizePixels={16} /> : null}
      {/* Its baseline is the mark's, so that it stands level within a sentence. */}
      <span style={{ alignSelf: 'baseline' }}>{children}</span>
    </span>
  );
}
