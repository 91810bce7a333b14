import { useEffect, useId, useRef, type ReactNode } from 'react';
import { color, face } from '@/components/theme';

export interface ModalFrameProps {
  open: boolean;
  title: ReactNode;
  /** Esc, the back gesture of the browser's dialog, or a press beside it. */
  onClose: () => void;
  className: string;
  titleEnd?: ReactNode;
  children?: ReactNode;
}

/**
 * The browser's own modal dialog: it keeps the focus within, makes the rest inert, closes on Esc, and gives the focus
 * back to where it was.
 */
export function ModalFrame({ open, title, onClose, className, titleEnd, children }: ModalFrameProps) {
  const ref = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const dialog = ref.current;
    if (!dialog || !open || dialog.open) return undefined;
    dialog.showModal();
    return () => dialog.close();
  }, [open]);
  return (
    <dialog
      ref={ref}
      aria-labelledby={titleId}
      className={className}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      // Some browsers close on a second Esc without asking.
      onClose={() => (open ? onClose() : undefined)}
      onClick={(event) => {
        if (event.target === event.currentTarget) onClose();
      }}
    >
      {open ? (
        <div className="modal-body">
          <div style={{ display: 'flex', alignItems: 'center', gap: 12, justifyContent: 'space-between' }}>
            <h2 id={titleId} style={{ font: `600 20px/26px ${face.text}`, color: color.ink }}>
              {title}
            </h2>
            {titleEnd}
          </div>
          {children}
        </div>
      ) : null}
    </dialog>
  );
}
