import type { CSSProperties } from 'react';
import { color, face } from '@/components/theme';
import { Icon, Link } from '@/components/ui';
import type { Place } from './place';

const frame: CSSProperties = {
  position: 'relative',
  display: 'grid',
  justifyItems: 'center',
  alignContent: 'center',
  gap: 3,
  minHeight: 64,
  textDecoration: 'none',
  outlineOffset: -3,
};
const badge: CSSProperties = {
  position: 'absolute',
  top: 7,
  left: 'calc(50% + 8px)',
  minWidth: 18,
  height: 18,
  padding: '0 4px',
  borderRadius: 3,
  background: color.accent,
  color: color.accentOn,
  font: `600 12px/18px ${face.mono}`,
  textAlign: 'center',
};
const markAtTop: CSSProperties = {
  position: 'absolute',
  top: -1,
  left: '50%',
  marginLeft: -7,
  borderStyle: 'solid',
  borderWidth: '8px 7px 0',
  borderColor: `${color.accent} transparent transparent`,
};
const markAtLeft: CSSProperties = {
  position: 'absolute',
  left: 0,
  top: '50%',
  marginTop: -7,
  borderStyle: 'solid',
  borderWidth: '7px 0 7px 8px',
  borderColor: `transparent transparent transparent ${color.accent}`,
};

export interface PlaceLinkProps {
  place: Place;
  current: boolean;
  mark: 'top' | 'left';
}

export function PlaceLink({ place, current, mark }: PlaceLinkProps) {
  return (
    <Link
      href={place.href}
      current={current ? 'page' : undefined}
      style={{
        ...frame,
        color: current ? color.ink : color.inkSoft,
        font: `${current ? 600 : 400} 12px/16px ${face.text}`,
      }}
    >
      {current ? <span style={mark === 'top' ? markAtTop : markAtLeft} /> : null}
      <Icon of={place.icon} sizePixels={24} tone={current ? 'accent' : 'soft'} />
      {place.label}
      {place.badge ? (
        <>
          <span aria-hidden style={badge}>
            {place.badge}
          </span>
          <span className="sr-only">{`, ${place.badge} waiting`}</span>
        </>
      ) : null}
    </Link>
  );
}
