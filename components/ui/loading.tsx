import { color, face } from '@/components/theme';

/** What is being fetched, in words; nothing turns. */
export function Loading({ children = 'Reading' }: { children?: string }) {
  return (
    <p role="status" style={{ padding: '16px 0', font: `400 14px/20px ${face.text}`, color: color.inkSoft }}>
      {children}
    </p>
  );
}
