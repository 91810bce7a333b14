import type { ReactNode } from 'react';
import CircleCheck from 'lucide-react-native/icons/circle-check';
import CircleX from 'lucide-react-native/icons/circle-x';
import TriangleAlert from 'lucide-react-native/icons/triangle-alert';
import { color, face, type Tone } from '@/components/theme';
import { Icon, type IconShape } from './icon';

export type CheckResult = 'passed' | 'look' | 'failed';

export interface CheckRowProps {
  result: CheckResult;
  name: string;
  value?: ReactNode;
  /** The limit it was held against, below the name. */
  limit?: ReactNode;
}

const looks: Record<CheckResult, { icon: IconShape; tone: Tone }> = {
  passed: { icon: CircleCheck, tone: 'good' },
  look: { icon: TriangleAlert, tone: 'warn' },
  failed: { icon: CircleX, tone: 'danger' },
};

/** One check of a design: the word first, then what was checked, its value, and the limit below. */
export function CheckRow({ result, name, value, limit }: CheckRowProps) {
  const look = looks[result];
  return (
    <div
      style={{
        display: 'grid',
        gridTemplateColumns: '20px minmax(0,1fr) auto',
        gap: '2px 10px',
        padding: '7px 0',
        font: `400 14px/20px ${face.text}`,
        color: color.ink,
      }}
    >
      <Icon of={look.icon} tone={look.tone} sizePixels={18} />
      <span>
        <b>{result}</b> {name}
      </span>
      <span style={{ fontFamily: face.mono, fontWeight: 700, letterSpacing: -0.3, textAlign: 'right' }}>
        {value}
      </span>
      {limit ? (
        <span style={{ gridColumn: '2 / 4', fontSize: 12, lineHeight: '16px', color: color.inkSoft }}>
          {limit}
        </span>
      ) : null}
    </div>
  );
}

/** Checks below one another, with hairlines between. */
export function CheckList({ checks, label }: { checks: readonly CheckRowProps[]; label: string }) {
  return (
    <ul aria-label={label}>
      {checks.map((check, place) => (
        <li key={check.name} style={{ borderTop: place === 0 ? undefined : `1px solid ${color.lineHair}` }}>
          <CheckRow {...check} />
        </li>
      ))}
    </ul>
  );
}
