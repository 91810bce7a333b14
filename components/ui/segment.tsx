import type { CSSProperties } from 'react';
import { color, face } from '@/components/theme';
import { focusPlace, placeAfterKey } from './rove';

export interface SegmentProps {
  options: readonly { value: string; label: string }[];
  value: string | undefined;
  onChange: (value: string) => void;
  label: string;
}

const part: CSSProperties = {
  minHeight: 'var(--hit)',
  minWidth: 48,
  padding: '0 12px',
  font: `400 14px/20px ${face.text}`,
  textAlign: 'center',
  outlineOffset: -2,
};

/** One of a few short words in an outlined row. */
export function Segment({ options, value, onChange, label }: SegmentProps) {
  const chosen = options.findIndex((option) => option.value === value);
  return (
    <div
      role="radiogroup"
      aria-label={label}
      style={{
        display: 'inline-flex',
        alignSelf: 'flex-start',
        maxWidth: '100%',
        border: `1.5px solid ${color.lineControl}`,
        borderRadius: 4,
        overflow: 'hidden',
        background: color.raised,
      }}
      onKeyDown={(event) => {
        const place = placeAfterKey(event.key, Math.max(0, chosen), options.length);
        const next = place === undefined ? undefined : options[place];
        if (!next || place === undefined) return;
        event.preventDefault();
        onChange(next.value);
        focusPlace(event.currentTarget, 'radio', place);
      }}
    >
      {options.map((option, place) => {
        const on = option.value === value;
        return (
          <button
            key={option.value}
            type="button"
            role="radio"
            aria-checked={on}
            tabIndex={on || (chosen < 0 && place === 0) ? 0 : -1}
            style={{
              ...part,
              borderLeft: place === 0 ? undefined : `1px solid ${color.lineRule}`,
              background: on ? color.accentSoft : undefined,
              color: on ? color.ink : color.inkSoft,
              fontWeight: on ? 600 : 400,
            }}
            onClick={() => onChange(option.value)}
          >
            {option.label}
          </button>
        );
      })}
    </div>
  );
}
