import type { CSSProperties, ReactNode } from 'react';
import { color, face } from '@/components/theme';
import type { Tone } from '@/components/theme';
import { Icon, type IconShape } from './icon';
import { Link } from './link';

export type ButtonKind = 'primary' | 'plain' | 'quiet' | 'danger';

export interface ButtonProps {
  /** A verb: Pin, Accept, Confirm. */
  children: ReactNode;
  kind?: ButtonKind;
  icon?: IconShape;
  onPress?: () => void;
  /** An address makes it a link that looks like a button. */
  href?: string;
  /** Sends the form it stands in. */
  submit?: boolean;
  /** Why it cannot be done now; the button then shows this sentence, dashed, and does nothing. */
  offReason?: string;
  /** What is being done, while it is being done: "Sending". Presses are ignored meanwhile. */
  busyText?: string;
  /** As wide as its place. */
  full?: boolean;
  /** Spoken instead of the words, where the same verb stands in many rows: "Retire pin Carries the ion". */
  label?: string;
  describedBy?: string;
  testID?: string;
}

const looks: Record<ButtonKind, { style: CSSProperties; tone: Tone; press: string }> = {
  primary: {
    style: { background: color.accent, borderColor: color.accent, color: color.accentOn },
    tone: 'accentOn',
    press: 'press-accent',
  },
  plain: {
    style: { background: color.raised, borderColor: color.lineControl, color: color.ink },
    tone: 'ink',
    press: 'press',
  },
  quiet: {
    style: { borderColor: 'transparent', color: color.accent, padding: '4px 10px' },
    tone: 'accent',
    press: 'press',
  },
  danger: {
    style: { background: color.raised, borderColor: color.danger, color: color.danger },
    tone: 'danger',
    press: 'press',
  },
};
const frame: CSSProperties = {
  display: 'inline-flex',
  alignItems: 'center',
  justifyContent: 'center',
  gap: 8,
  minHeight: 'var(--hit)',
  minWidth: 44,
  maxWidth: '100%',
  padding: '4px 16px',
  borderWidth: 1.5,
  borderStyle: 'solid',
  borderRadius: 4,
  font: `600 var(--body-size)/20px ${face.text}`,
  textAlign: 'center',
  textDecoration: 'none',
};
const off: CSSProperties = {
  borderStyle: 'dashed',
  borderColor: color.lineRule,
  background: 'none',
  color: color.inkFaint,
};

export function Button(props: ButtonProps) {
  const { children, kind = 'plain', icon, onPress, href, submit, offReason, busyText, full, label } = props;
  const look = looks[kind];
  const isOff = offReason !== undefined;
  const style: CSSProperties = {
    ...frame,
    ...look.style,
    ...(isOff ? off : null),
    ...(full ? { width: '100%' } : null),
  };
  const content = (
    <>
      {icon ? <Icon of={icon} tone={isOff ? 'faint' : look.tone} /> : null}
      <span>{offReason ?? busyText ?? children}</span>
    </>
  );
  if (href && !isOff) {
    return (
      <Link href={href} className={`${look.press} no-print`} style={style} label={label}>
        {content}
      </Link>
    );
  }
  // Off and busy stay in the tab order, so that the reason can be read; they only stop doing anything.
  const resting = isOff || busyText !== undefined;
  return (
    <button
      type={submit ? 'submit' : 'button'}
      className={resting ? undefined : look.press}
      style={style}
      aria-label={resting ? undefined : label}
      aria-disabled={resting || undefined}
      aria-busy={busyText !== undefined || undefined}
      aria-describedby={props.describedBy}
      data-testid={props.testID}
      onClick={(event) => {
        if (resting) event.preventDefault();
        else onPress?.();
      }}
    >
      {content}
    </button>
  );
}
