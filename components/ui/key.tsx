import { color, face } from '@/components/theme';

/** A key of the keyboard. */
export function Key({ children }: { children: string }) {
  return (
    <kbd
      style={{
        display: 'inline-grid',
        placeItems: 'center',
        minWidth: 22,
        height: 22,
        padding: '0 5px',
        border: `1px solid ${color.lineControl}`,
        borderRadius: 3,
        background: color.raised,
        color: color.inkSoft,
        font: `600 12px/16px ${face.mono}`,
      }}
    >
      {children}
    </kbd>
  );
}
