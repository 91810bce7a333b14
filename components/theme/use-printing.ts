import { useSyncExternalStore } from 'react';

const query = () => globalThis.matchMedia?.('print');

function subscribe(changed: () => void): () => void {
  const print = query();
  print?.addEventListener('change', changed);
  return () => print?.removeEventListener('change', changed);
}

/** Whether the page is being put on paper: lists are then shown whole, and what can only be pressed is left out. */
export function usePrinting(): boolean {
  return useSyncExternalStore(
    subscribe,
    () => query()?.matches ?? false,
    () => false,
  );
}
