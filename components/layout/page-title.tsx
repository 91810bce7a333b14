import type { ReactNode } from 'react';
import { color, face, useLayout } from '@/components/theme';

export interface PageTitleProps {
  children: ReactNode;
  /** Beside it at the right, or below: a sentence in soft ink. */
  detail?: ReactNode;
  action?: ReactNode;
  /** 28 px, for desk and start; 20 px elsewhere. */
  large?: boolean;
  /** Where a phone's top bar says the same, the heading is only spoken there. */
  quietOnPhone?: boolean;
}

/** The page's first heading. */
export function PageTitle({ children, detail, action, large, quietOnPhone }: PageTitleProps) {
  const { hasRail } = useLayout();
  const isQuiet = quietOnPhone === true && !hasRail;
  const heading = (
    <h1
      className={isQuiet ? 'sr-only' : undefined}
      style={{
        font: `600 ${large ? '28px/34px' : '20px/26px'} ${face.text}`,
        color: color.ink,
        overflowWrap: 'anywhere',
      }}
    >
      {children}
    </h1>
  );
  if (isQuiet && !detail && !action) return heading;
  return (
    <div
      style={{ display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '4px 12px', paddingBottom: 8 }}
    >
      {heading}
      {detail ? (
        <span
          style={{
            font: `400 14px/20px ${face.text}`,
            color: color.inkSoft,
            marginLeft: isQuiet ? 0 : undefined,
          }}
        >
          {detail}
        </span>
      ) : null}
      {action ? <span style={{ marginLeft: 'auto' }}>{action}</span> : null}
    </div>
  );
}
