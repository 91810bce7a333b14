import type { ReactNode } from 'react';
import { useLayout } from '@/components/theme';
import { Dialog, Sheet } from '@/components/ui';

interface FormFrameProps {
  open: boolean;
  title: ReactNode;
  onClose: () => void;
  children: ReactNode;
}

/** A sheet from below on a phone, a dialog on a wide screen. */
export function FormFrame(props: FormFrameProps) {
  const { hasRail } = useLayout();
  return hasRail ? <Dialog {...props} /> : <Sheet {...props} />;
}
