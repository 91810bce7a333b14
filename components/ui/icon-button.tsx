import type { CSSProperties } from 'react';
import { Icon, type IconShape } from './icon';
import { Link } from './link';

export interface IconButtonProps {
  icon: IconShape;
  /** What it does; spoken, and shown by the browser on hover. */
  label: string;
  onPress?: () => void;
  href?: string;
  /** Switched on, for a button that toggles. */
  on?: boolean;
  expanded?: boolean;
}

const frame: CSSProperties = {
  display: 'inline-grid',
  placeItems: 'center',
  width: 'var(--hit)',
  height: 'var(--hit)',
  flex: 'none',
  borderRadius: 4,
};

export function IconButton({ icon, label, onPress, href, on, expanded }: IconButtonProps) {
  const drawing = <Icon of={icon} tone={on ? 'accent' : 'soft'} />;
  if (href) {
    return (
      <Link href={href} label={label} className="press no-print" style={frame}>
        {drawing}
      </Link>
    );
  }
  return (
    <button
      type="button"
      title={label}
      aria-label={label}
      aria-pressed={on}
      aria-expanded={expanded}
      className="press"
      style={frame}
      onClick={onPress}
    >
      {drawing}
    </button>
  );
}
