import type { ReactNode } from 'react';
import { ModalFrame } from './modal-frame';

export interface DialogProps {
  open: boolean;
  /** A question or a name: "Retire this pin?". */
  title: ReactNode;
  onClose: () => void;
  children?: ReactNode;
  /** The answers, the one that goes on last. */
  actions?: ReactNode;
}

/** A question in the middle of a wide screen; on a phone it rises from below. */
export function Dialog({ open, title, onClose, children, actions }: DialogProps) {
  return (
    <ModalFrame open={open} title={title} onClose={onClose} className="dialog">
      {children}
      {actions ? (
        <div style={{ display: 'flex', flexWrap: 'wrap', gap: 8, justifyContent: 'flex-end' }}>{actions}</div>
      ) : null}
    </ModalFrame>
  );
}
