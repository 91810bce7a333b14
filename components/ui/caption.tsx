import type { ReactNode } from 'react';
import { color, face } from '@/components/theme';

export interface CaptionProps {
  children: ReactNode;
  /** Beside it in soft ink: "4 on this residue". */
  count?: ReactNode;
  /** At the end of the rule, usually a quiet button. */
  action?: ReactNode;
  level?: 2 | 3;
  id?: string;
}

/** A heading within a page: words, count, a rule to the right, an action at its end. */
export function Caption({ children, count, action, level = 2, id }: CaptionProps) {
  const Heading = level === 2 ? 'h2' : 'h3';
  return (
    <div
      style={{
        display: 'flex',
        alignItems: 'center',
        gap: 10,
        minHeight: 28,
        font: `400 14px/20px ${face.text}`,
      }}
    >
      <Heading
        id={id}
        style={{ font: `600 14px/20px ${face.text}`, color: color.ink, minWidth: 'min-content' }}
      >
        {children}
      </Heading>
      {count === undefined ? null : <span style={{ color: color.inkSoft }}>{count}</span>}
      <span style={{ flex: 1, minWidth: 8, height: 1, background: color.lineRule }} />
      {action}
    </div>
  );
}
