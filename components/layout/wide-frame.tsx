import type { CSSProperties } from 'react';
import { color, face, layer, measure } from '@/components/theme';
import { Link, Logo } from '@/components/ui';
import type { FrameProps, ProjectName } from './app-shell';
import { PlaceLink } from './place-link';

const frame: CSSProperties = {
  flex: 1,
  minHeight: 0,
  display: 'grid',
  gridTemplateColumns: `${measure.rail}px minmax(0,1fr)`,
  gridTemplateRows: `${measure.topBar}px minmax(0,1fr) auto`,
};
const rail: CSSProperties = {
  gridRow: '1 / 4',
  display: 'flex',
  flexDirection: 'column',
  minHeight: 0,
  overflowY: 'auto',
  borderRight: `1px solid ${color.lineRule}`,
  background: color.raised,
};
const topBar: CSSProperties = {
  position: 'relative',
  zIndex: layer.sticky,
  display: 'flex',
  alignItems: 'center',
  gap: 16,
  padding: '0 20px',
  borderBottom: `1px solid ${color.lineRule}`,
  background: color.paper,
};

function Project({ project }: { project: ProjectName }) {
  const words = (
    <>
      <b style={{ font: `600 16px/24px ${face.text}` }}>{project.name}</b>
      {project.detail ? <span style={{ color: color.inkSoft }}> {project.detail}</span> : null}
    </>
  );
  const style: CSSProperties = {
    color: color.ink,
    textDecoration: 'none',
    minHeight: 44,
    display: 'flex',
    alignItems: 'center',
    gap: 6,
    whiteSpace: 'nowrap',
    maxWidth: 320,
    overflow: 'hidden',
  };
  if (!project.href) return <div style={style}>{words}</div>;
  return (
    <Link href={project.href} style={style} className="row-link">
      {words}
    </Link>
  );
}

/** From 1000 pixels: rail, top bar, page, and the title block at the foot. */
export function WideFrame({ places, currentPlace, homeHref, project, locator, people, ...rest }: FrameProps) {
  const { railFoot, notice, children, fill } = rest;
  return (
    <div className="frame" style={frame}>
      <nav aria-label="Places" style={rail}>
        <Link
          href={homeHref}
          label="Locant, all projects"
          style={{
            height: measure.topBar,
            flex: 'none',
            display: 'grid',
            placeItems: 'center',
            borderBottom: `1px solid ${color.lineRule}`,
            outlineOffset: -3,
          }}
        >
          <Logo />
        </Link>
        <ul style={{ flex: 'none' }}>
          {places.map((place) => (
            <li key={place.key}>
              <PlaceLink place={place} current={place.key === currentPlace} mark="left" />
            </li>
          ))}
        </ul>
        <div
          style={{
            marginTop: 'auto',
            display: 'grid',
            justifyItems: 'center',
            gap: 4,
            padding: '8px 0 12px',
          }}
        >
          {railFoot}
        </div>
      </nav>
      <header style={topBar} className="no-print">
        {project ? <Project project={project} /> : null}
        <div role={locator ? 'search' : undefined} style={{ flex: '0 1 460px', minWidth: 0 }}>
          {locator}
        </div>
        <div style={{ marginLeft: 'auto', display: 'flex', alignItems: 'center', gap: 8 }}>{people}</div>
      </header>
      <main
        id="main"
        tabIndex={-1}
        style={{ minWidth: 0, minHeight: 0, display: 'flex', flexDirection: 'column', overflow: 'hidden' }}
      >
        {notice}
        {children}
      </main>
      <footer ref={fill.block} style={{ minWidth: 0 }} />
    </div>
  );
}
