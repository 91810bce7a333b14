import type { ReactNode } from 'react';
import { color, face } from '@/components/theme';

export interface KeyValueRowProps {
  name: ReactNode;
  value: ReactNode;
  /** Labels, chains and numbers stand in the mono face. */
  mono?: boolean;
  /** The preferred one. */
  strong?: boolean;
}

/** One line of a passport: the name in soft ink at the left, the value at the right. Stands in a KeyValueList. */
export function KeyValueRow({ name, value, mono, strong }: KeyValueRowProps) {
  return (
    <div
      className="key-value"
      style={{
        display: 'flex',
        justifyContent: 'space-between',
        alignItems: 'baseline',
        gap: 16,
        padding: '7px 0',
        borderTop: `1px solid ${color.lineHair}`,
      }}
    >
      <dt style={{ color: color.inkSoft, minWidth: 0 }}>{name}</dt>
      <dd
        style={{
          textAlign: 'right',
          minWidth: 0,
          overflowWrap: 'anywhere',
          fontFamily: mono ? face.mono : undefined,
          fontWeight: strong ? 700 : 400,
        }}
      >
        {value}
      </dd>
    </div>
  );
}

export function KeyValueList({ children, label }: { children: ReactNode; label?: string }) {
  return (
    <dl aria-label={label} style={{ font: `400 14px/20px ${face.text}`, color: color.ink, marginTop: -1 }}>
      {children}
    </dl>
  );
}
