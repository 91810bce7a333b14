import { useEffect, useRef } from 'react';
import { Banner } from '@/components/ui';

/**
 * After chains were confirmed: that it is done, and what can be done now. The button that was pressed is gone, so the
 * sentence comes into sight and takes the focus.
 */
export function JustConfirmed({ example }: { example: string }) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    void box.current?.scrollIntoView({ block: 'nearest' });
    box.current?.focus({ preventScroll: true });
  }, []);
  return (
    <div ref={box} tabIndex={-1}>
      <Banner kind="good">
        <b>Confirmed.</b> {`Their residues are found by chain and author number now, such as ${example}.`}
      </Banner>
    </div>
  );
}
