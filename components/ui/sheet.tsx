import type { ReactNode } from 'react';
import X from 'lucide-react-native/icons/x';
import { IconButton } from './icon-button';
import { ModalFrame } from './modal-frame';

export interface SheetProps {
  open: boolean;
  title: ReactNode;
  onClose: () => void;
  children?: ReactNode;
}

/** A sheet from below on a phone, from the right on a wide screen, for what is looked at or filled in beside the page. */
export function Sheet({ open, title, onClose, children }: SheetProps) {
  return (
    <ModalFrame
      open={open}
      title={title}
      onClose={onClose}
      className="sheet"
      titleEnd={<IconButton icon={X} label="Close" onPress={onClose} />}
    >
      {children}
    </ModalFrame>
  );
}
