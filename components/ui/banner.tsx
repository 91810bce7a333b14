import type { ReactNode } from 'react';
import CircleAlert from 'lucide-react-native/icons/octagon-alert';
import CircleCheck from 'lucide-react-native/icons/circle-check';
import Info from 'lucide-react-native/icons/info';
import TriangleAlert from 'lucide-react-native/icons/triangle-alert';
import { color, face, type Tone } from '@/components/theme';
import { Icon, type IconShape } from './icon';

export type BannerKind = 'note' | 'warn' | 'danger' | 'good';

export interface BannerProps {
  kind?: BannerKind;
  children: ReactNode;
  action?: ReactNode;
  /** Set false where it stands there from the start and is no news. */
  announce?: boolean;
}

const looks: Record<BannerKind, { icon: IconShape; tone: Tone; ground: string; word: string }> = {
  note: { icon: Info, tone: 'accent', ground: color.accentSoft, word: 'note' },
  warn: { icon: TriangleAlert, tone: 'warn', ground: color.warnSoft, word: 'warning' },
  danger: { icon: CircleAlert, tone: 'danger', ground: color.dangerSoft, word: 'error' },
  good: { icon: CircleCheck, tone: 'good', ground: color.goodSoft, word: 'done' },
};

/** One sentence about the state of things, with its icon and at most one action. */
export function Banner({ kind = 'note', children, action, announce = true }: BannerProps) {
  const look = looks[kind];
  const liveRole = kind === 'danger' ? 'alert' : 'status';
  return (
    <div
      role={announce ? liveRole : undefined}
      style={{
        display: 'flex',
        flexWrap: 'wrap',
        alignItems: 'center',
        gap: '8px 10px',
        padding: '10px 14px',
        borderRadius: 4,
        background: look.ground,
        color: color.ink,
        font: `400 14px/20px ${face.text}`,
      }}
    >
      <span style={{ alignSelf: 'flex-start', lineHeight: 0 }}>
        <Icon of={look.icon} tone={look.tone} label={look.word} />
      </span>
      <div style={{ flex: '1 1 180px', minWidth: 0, overflowWrap: 'anywhere' }}>{children}</div>
      {action}
    </div>
  );
}
