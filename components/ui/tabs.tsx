import type { CSSProperties } from 'react';
import { color, face } from '@/components/theme';
import { focusPlace, placeAfterKey } from './rove';

export interface TabItem {
  key: string;
  label: string;
  count?: number;
}

export interface TabsProps {
  items: readonly TabItem[];
  current: string;
  onChange: (key: string) => void;
  /** What the tabs choose between: "Source". */
  label: string;
  /** Id of the panel they switch; give it role="tabpanel". */
  panelId?: string;
}

const tab: CSSProperties = {
  position: 'relative',
  flex: 'none',
  minHeight: 'var(--hit)',
  padding: '0 12px',
  font: `400 14px/20px ${face.text}`,
};
const line: CSSProperties = {
  position: 'absolute',
  left: 0,
  right: 0,
  bottom: 0,
  height: 3,
  background: color.accent,
};
const mark: CSSProperties = {
  position: 'absolute',
  left: '50%',
  bottom: 3,
  marginLeft: -5,
  borderStyle: 'solid',
  borderWidth: '0 5px 5px',
  borderColor: `transparent transparent ${color.accent}`,
};

/** Arrow keys move and choose; the index mark stands on the current one. */
export function Tabs({ items, current, onChange, label, panelId }: TabsProps) {
  return (
    <div
      role="tablist"
      aria-label={label}
      className="scroll-x bare no-print"
      style={{ display: 'flex', gap: 4, borderBottom: `1px solid ${color.lineRule}` }}
      onKeyDown={(event) => {
        const from = items.findIndex((item) => item.key === current);
        const place = placeAfterKey(event.key, from, items.length);
        const next = place === undefined ? undefined : items[place];
        if (!next || place === undefined) return;
        event.preventDefault();
        onChange(next.key);
        focusPlace(event.currentTarget, 'tab', place);
      }}
    >
      {items.map((item) => {
        const on = item.key === current;
        return (
          <button
            key={item.key}
            type="button"
            role="tab"
            aria-selected={on}
            aria-controls={on ? panelId : undefined}
            tabIndex={on ? 0 : -1}
            style={{
              ...tab,
              color: on ? color.ink : color.inkSoft,
              fontWeight: on ? 600 : 400,
              outlineOffset: -2,
            }}
            onClick={() => onChange(item.key)}
          >
            {item.label}
            {item.count === undefined ? null : ` ${item.count}`}
            {on ? <span style={line} /> : null}
            {on ? <span style={mark} /> : null}
          </button>
        );
      })}
    </div>
  );
}
