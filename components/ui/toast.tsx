import { color, face, lift } from '@/components/theme';

export interface ToastProps {
  /** What was done: "Pin on c E59 retired". */
  children: string;
  onUndo?: () => void;
}

/** What was just done, and for a while the way back. The one who shows it takes it away again. */
export function Toast({ children, onUndo }: ToastProps) {
  return (
    <div
      role="status"
      className="no-print"
      style={{
        display: 'flex',
        alignItems: 'center',
        gap: 10,
        minHeight: 52,
        padding: '0 4px 0 14px',
        borderRadius: 4,
        background: color.ink,
        color: color.paper,
        boxShadow: lift.float,
        font: `400 14px/20px ${face.text}`,
      }}
    >
      <span style={{ flex: 1, minWidth: 0 }}>{children}</span>
      {onUndo ? (
        <button
          type="button"
          onClick={onUndo}
          style={{
            minHeight: 44,
            minWidth: 64,
            textAlign: 'center',
            fontWeight: 600,
            textDecoration: 'underline',
          }}
        >
          Undo
        </button>
      ) : null}
    </div>
  );
}
