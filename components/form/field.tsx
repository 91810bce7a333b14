import { useId, type ReactNode } from 'react';
import CircleAlert from 'lucide-react-native/icons/circle-alert';
import { color, face } from '@/components/theme';
import { Icon } from '@/components/ui';

export interface FieldWords {
  label: ReactNode;
  hint?: ReactNode;
  /** What is wrong, where, and what to do. */
  error?: string;
  /** At the end of the label's line: a link or a count. */
  labelEnd?: ReactNode;
  /** The label is spoken but not shown, where the place says it already. */
  quietLabel?: boolean;
}

/** What a control needs so that its label, hint and error are read with it. */
export interface ControlIds {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
}

export interface FieldProps extends FieldWords {
  children: (ids: ControlIds) => ReactNode;
}

/** Label above, hint and error below. */
export function Field({ label, hint: given, error, labelEnd, quietLabel, children }: FieldProps) {
  const id = useId();
  // The hint often says what the error then says: once is enough.
  const hint = given === error ? undefined : given;
  const described = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ');
  const ids: ControlIds = {
    id,
    'aria-describedby': described || undefined,
    'aria-invalid': error ? true : undefined,
  };
  return (
    <div
      style={{ display: 'grid', gap: 4, minWidth: 0, font: `400 14px/20px ${face.text}`, color: color.ink }}
    >
      <div
        className={quietLabel ? 'sr-only' : undefined}
        style={{ display: 'flex', justifyContent: 'space-between', gap: 12 }}
      >
        <label htmlFor={id} style={{ fontWeight: 600 }}>
          {label}
        </label>
        {labelEnd}
      </div>
      {children(ids)}
      {error ? (
        <p
          id={`${id}-error`}
          role="alert"
          style={{ display: 'flex', gap: 5, color: color.danger, font: `600 12px/16px ${face.text}` }}
        >
          <Icon of={CircleAlert} tone="danger" sizePixels={16} />
          <span>{error}</span>
        </p>
      ) : null}
      {hint ? (
        <p id={`${id}-hint`} style={{ color: color.inkSoft }}>
          {hint}
        </p>
      ) : null}
    </div>
  );
}
