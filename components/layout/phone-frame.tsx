import type { CSSProperties } from 'react';
import { color, layer, measure } from '@/components/theme';
import type { FrameProps } from './app-shell';
import { PlaceLink } from './place-link';

const topBar: CSSProperties = {
  flex: 'none',
  position: 'relative',
  zIndex: layer.sticky,
  display: 'flex',
  alignItems: 'center',
  gap: 4,
  height: measure.topBar,
  paddingRight: 4,
  borderBottom: `1px solid ${color.lineRule}`,
  background: color.paper,
};

/** Below 1000 pixels: top bar, context strip, page, what can be done, and the places under the thumb. */
export function PhoneFrame({ places, currentPlace, phoneEnd, notice, children, fill }: FrameProps) {
  return (
    <>
      <header style={{ flex: 'none', minWidth: 0 }}>
        <div className="no-print" style={topBar}>
          <div ref={fill.title} style={{ flex: 1, minWidth: 0, display: 'flex', alignItems: 'center' }} />
          {phoneEnd}
        </div>
        <div ref={fill.strip} />
      </header>
      <main
        id="main"
        tabIndex={-1}
        style={{
          flex: 1,
          minHeight: 0,
          minWidth: 0,
          display: 'flex',
          flexDirection: 'column',
          overflow: 'hidden',
        }}
      >
        {notice}
        {children}
        <div ref={fill.actions} className="no-print" style={{ flex: 'none' }} />
      </main>
      <nav
        aria-label="Places"
        style={{
          flex: 'none',
          position: 'relative',
          zIndex: layer.rail,
          borderTop: `1px solid ${color.lineRule}`,
          background: color.raised,
          paddingBottom: 'env(safe-area-inset-bottom)',
        }}
      >
        <ul
          style={{
            display: 'grid',
            gridTemplateColumns: `repeat(${Math.max(1, places.length)}, minmax(0,1fr))`,
          }}
        >
          {places.map((place) => (
            <li key={place.key}>
              <PlaceLink place={place} current={place.key === currentPlace} mark="top" />
            </li>
          ))}
        </ul>
      </nav>
    </>
  );
}
