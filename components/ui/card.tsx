import type { ReactNode } from 'react';
import { color } from '@/components/theme';

/** Raised ground for what is read or acted on as one piece; `sunken` for quoted file text. */
export function Card({ children, sunken = false }: { children: ReactNode; sunken?: boolean }) {
  return (
    <div
      style={{
        background: sunken ? color.sunken : color.raised,
        border: sunken ? undefined : `1px solid ${color.lineHair}`,
        borderRadius: 4,
        padding: '12px 14px',
        minWidth: 0,
      }}
    >
      {children}
    </div>
  );
}
