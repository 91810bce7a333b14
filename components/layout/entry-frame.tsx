import type { ReactNode } from 'react';
import { color, face, useLayout } from '@/components/theme';
import { Logo } from '@/components/ui';

export interface EntryFrameProps {
  /** Beside the form on a wide screen: what the product does, with a plate. */
  aside?: ReactNode;
  children: ReactNode;
}

/** The pages before a project is open: signing in, signing up, choosing a project. */
export function EntryFrame({ aside, children }: EntryFrameProps) {
  const { hasRail } = useLayout();
  const sign = (
    <div
      style={{
        display: 'flex',
        gap: 8,
        alignItems: 'center',
        font: `600 20px/26px ${face.text}`,
        color: color.ink,
      }}
    >
      <Logo />
      Locant
    </div>
  );
  return (
    <div
      style={{
        flex: 1,
        minHeight: 0,
        height: '100%',
        display: 'flex',
        overflow: hasRail ? 'hidden' : 'auto',
      }}
    >
      {hasRail && aside ? (
        <aside
          aria-label="About Locant"
          style={{
            flex: '61 1 0',
            minWidth: 0,
            overflowY: 'auto',
            padding: '56px 72px',
            background: color.sunken,
            borderRight: `1px solid ${color.lineRule}`,
            display: 'flex',
            flexDirection: 'column',
          }}
        >
          {sign}
          <div style={{ margin: 'auto 0', maxWidth: 600 }}>{aside}</div>
        </aside>
      ) : null}
      <main
        id="main"
        tabIndex={-1}
        style={{
          flex: '39 1 0',
          minWidth: 0,
          overflowY: hasRail ? 'auto' : undefined,
          display: 'flex',
          flexDirection: 'column',
          padding: hasRail ? '24px 60px' : '24px 16px',
        }}
      >
        {hasRail && aside ? null : sign}
        <div style={{ width: '100%', maxWidth: 480, margin: hasRail ? 'auto' : '24px auto' }}>{children}</div>
      </main>
    </div>
  );
}
