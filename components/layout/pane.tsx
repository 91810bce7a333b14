import type { ReactNode } from 'react';

export interface PaneProps {
  /** Its name, for screen readers and F6. */
  label: string;
  /** Without padding and scrolling of its own, for a drawing that fills it. */
  flat?: boolean;
  /** Stands below the others on the page instead of scrolling by itself. */
  stacked?: boolean;
  children: ReactNode;
}

export function Pane({ label, flat, stacked, children }: PaneProps) {
  const sides = stacked ? '16px var(--gutter)' : '18px 20px';
  return (
    <section
      aria-label={label}
      data-pane=""
      tabIndex={-1}
      style={{
        minWidth: 0,
        minHeight: 0,
        height: stacked ? undefined : '100%',
        padding: flat ? 0 : sides,
        overflowY: stacked ? undefined : flat ? 'hidden' : 'auto',
        scrollbarWidth: 'thin',
        position: 'relative',
        display: flat ? 'flex' : undefined,
        flexDirection: flat ? 'column' : undefined,
      }}
    >
      {children}
    </section>
  );
}
