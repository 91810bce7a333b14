import { useId, type CSSProperties, type ReactNode } from 'react';
import { color, face } from '@/components/theme';
import { focusPlace, placeAfterKey } from './rove';

export interface ChoiceOption {
  value: string;
  /** A sentence. */
  title: ReactNode;
  /** What follows from choosing it, in soft ink; may hold a drawing. */
  consequence?: ReactNode;
  /** Why it cannot be chosen. */
  offReason?: string;
}

export interface ChoiceProps {
  label: string;
  options: readonly ChoiceOption[];
  value: string | undefined;
  onChange: (value: string) => void;
}

const ring = (on: boolean): CSSProperties => ({
  width: 18,
  height: 18,
  flex: 'none',
  marginTop: 1,
  borderRadius: 18,
  border: on ? `6px solid ${color.accent}` : `2px solid ${color.lineControl}`,
});

/** Cards of which one is chosen; each says what follows from it. */
export function Choice({ label, options, value, onChange }: ChoiceProps) {
  const id = useId();
  const open = options.filter((option) => option.offReason === undefined);
  const chosen = open.findIndex((option) => option.value === value);
  return (
    <div
      role="radiogroup"
      aria-label={label}
      style={{ display: 'grid', gap: 8 }}
      onKeyDown={(event) => {
        const place = placeAfterKey(event.key, Math.max(0, chosen), open.length);
        const next = place === undefined ? undefined : open[place];
        if (!next) return;
        event.preventDefault();
        onChange(next.value);
        focusPlace(event.currentTarget, 'radio', options.indexOf(next));
      }}
    >
      {options.map((option, place) => {
        const on = option.value === value;
        const isOff = option.offReason !== undefined;
        return (
          <button
            key={option.value}
            type="button"
            role="radio"
            aria-checked={on}
            aria-disabled={isOff || undefined}
            aria-labelledby={`${id}-${place}-title`}
            aria-describedby={`${id}-${place}-more`}
            tabIndex={!isOff && (on || (chosen < 0 && open[0] === option)) ? 0 : -1}
            style={{
              display: 'flex',
              gap: 10,
              alignItems: 'flex-start',
              minHeight: 48,
              padding: '10px 12px',
              border: `1.5px ${isOff ? 'dashed' : 'solid'} ${on ? color.accent : color.lineControl}`,
              borderRadius: 4,
              background: on ? color.accentSoft : color.raised,
              color: isOff ? color.inkFaint : color.ink,
              font: `400 14px/20px ${face.text}`,
            }}
            onClick={() => (isOff ? undefined : onChange(option.value))}
          >
            <span style={ring(on)} />
            <span style={{ flex: 1, minWidth: 0 }}>
              <span id={`${id}-${place}-title`} style={{ display: 'block', fontWeight: 600 }}>
                {option.title}
              </span>
              <span id={`${id}-${place}-more`} style={{ display: 'block', color: color.inkSoft }}>
                {option.offReason ?? option.consequence}
              </span>
            </span>
          </button>
        );
      })}
    </div>
  );
}
