import type { ReactNode } from 'react';
import { Stack } from '@/components/ui';

interface FormProps {
  onSubmit: () => void;
  gap?: number;
  children: ReactNode;
}

/** The fields and the button that sends them. What is wrong is said by the fields, never by the browser. */
export function Form({ onSubmit, gap = 16, children }: FormProps) {
  return (
    <form
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        onSubmit();
      }}
    >
      <Stack gap={gap}>{children}</Stack>
    </form>
  );
}
