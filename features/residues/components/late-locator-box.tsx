import { useRef } from 'react';
import { useEarlyEntry, useLateParts } from '../late-parts';
import { LocatorInput } from './locator-input';

/** The box that finds residues: an input at once, its list as soon as the code of it is here. */
export function LateLocatorBox({ projectId }: { projectId: string }) {
  const place = useRef<HTMLDivElement>(null);
  const parts = useLateParts(place);
  const early = useEarlyEntry();
  return (
    <div ref={place} style={{ display: 'contents' }}>
      {parts ? <parts.LocatorBox projectId={projectId} early={early} /> : <LocatorInput locator={early} />}
    </div>
  );
}
