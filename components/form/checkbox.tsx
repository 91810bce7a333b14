import { useId, type ReactNode, type Ref } from 'react';
import { color, face } from '@/components/theme';

export interface CheckboxProps {
  label: ReactNode;
  hint?: ReactNode;
  value: boolean;
  onChange: (value: boolean) => void;
  onBlur?: () => void;
  name?: string;
  ref?: Ref<HTMLInputElement>;
}

export function Checkbox({ label, hint, value, onChange, ...rest }: CheckboxProps) {
  const id = useId();
  return (
    <label
      style={{
        display: 'flex',
        gap: 10,
        alignItems: 'flex-start',
        minHeight: 'var(--hit)',
        padding: '10px 0',
        font: `400 14px/20px ${face.text}`,
        color: color.ink,
      }}
    >
      <input
        {...rest}
        type="checkbox"
        checked={value}
        aria-describedby={hint ? `${id}-hint` : undefined}
        style={{ width: 20, height: 20, flex: 'none', accentColor: color.accent }}
        onChange={(event) => onChange(event.target.checked)}
      />
      <span style={{ minWidth: 0 }}>
        {label}
        {hint ? (
          <span id={`${id}-hint`} style={{ display: 'block', color: color.inkSoft }}>
            {hint}
          </span>
        ) : null}
      </span>
    </label>
  );
}
