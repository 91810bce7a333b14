import type { ReactNode } from 'react';
import { color, face } from '@/components/theme';

export interface EmptyProps {
  /** What is missing: "No mutation planned here yet". */
  title: string;
  /** What would fill it, and who may. */
  children?: ReactNode;
  action?: ReactNode;
}

export function Empty({ title, children, action }: EmptyProps) {
  return (
    <div
      style={{
        display: 'grid',
        gap: 8,
        justifyItems: 'start',
        padding: '18px 16px',
        border: `1.5px dashed ${color.lineRule}`,
        borderRadius: 4,
        color: color.inkSoft,
        font: `400 14px/20px ${face.text}`,
      }}
    >
      <p style={{ font: `600 16px/24px ${face.text}`, color: color.ink }}>{title}</p>
      {children ? <div>{children}</div> : null}
      {action}
    </div>
  );
}
