import type { CSSProperties, ReactNode } from 'react';
import { color, face, measure } from '@/components/theme';

/** What must be known to read the page rightly: numbering mature, alignment c, revision 4. */
export interface TitleItem {
  key: string;
  label: string;
  value: ReactNode;
}

export interface TitleBlockProps {
  items: readonly TitleItem[];
  /** At the end: all saved, waiting, invented data. */
  saved?: ReactNode;
}

const bar: CSSProperties = {
  display: 'flex',
  alignItems: 'stretch',
  background: color.sunken,
  color: color.inkSoft,
  font: `400 12px/16px ${face.text}`,
};

/** At the foot of every wide screen, and at the end of each printed page. */
export function TitleBlock({ items, saved }: TitleBlockProps) {
  const cell: CSSProperties = {
    display: 'flex',
    gap: 6,
    alignItems: 'center',
    padding: '0 16px',
    borderRight: `1px solid ${color.lineRule}`,
    whiteSpace: 'nowrap',
  };
  return (
    <div
      className="scroll-x bare"
      role="group"
      aria-label="What this page shows"
      style={{ ...bar, minHeight: measure.titleBlock, borderTop: `1px solid ${color.lineRule}` }}
    >
      <dl style={{ display: 'flex', flex: 'none' }}>
        {items.map((item) => (
          <div key={item.key} style={cell}>
            <dt>{item.label}</dt>
            <dd style={{ fontWeight: 600, color: color.ink }}>{item.value}</dd>
          </div>
        ))}
      </dl>
      {saved === undefined ? null : (
        <div
          role="status"
          style={{
            ...cell,
            marginLeft: 'auto',
            flex: 'none',
            borderRight: 0,
            borderLeft: `1px solid ${color.lineRule}`,
          }}
        >
          {saved}
        </div>
      )}
    </div>
  );
}

/** The same on a phone: a strip under the title that stays there and scrolls sideways. */
export function ContextStrip({ items, saved }: TitleBlockProps) {
  return (
    <div
      className="scroll-x bare"
      role="group"
      aria-label="What this page shows"
      tabIndex={0}
      style={{
        ...bar,
        minHeight: measure.contextStrip,
        borderBottom: `1px solid ${color.lineHair}`,
        outlineOffset: -2,
      }}
    >
      {saved === undefined ? null : (
        <div role="status" style={{ padding: '7px 0 7px 16px', flex: 'none', whiteSpace: 'nowrap' }}>
          {saved}
        </div>
      )}
      <dl style={{ display: 'flex', flex: 'none' }}>
        {items.map((item, place) => (
          <div
            key={item.key}
            style={{
              display: 'flex',
              gap: 4,
              padding: place === 0 ? '7px 12px 7px 16px' : '7px 12px',
              borderRight: `1px solid ${color.lineRule}`,
              whiteSpace: 'nowrap',
            }}
          >
            <dt>{item.label}</dt>
            <dd style={{ fontWeight: 600, color: color.ink }}>{item.value}</dd>
          </div>
        ))}
      </dl>
    </div>
  );
}
