import { useEffect, useState, type RefObject } from 'react';
import { flushSync } from 'react-dom';
import type { LocatorEntry } from './components/locator-input';
import type * as locatorParts from './locator-parts';

type Parts = typeof locatorParts;

const againAfterMilliseconds = 3000;
let parts: Parts | null = null;

async function fetchParts(): Promise<Parts | null> {
  try {
    parts ??= await import('./locator-parts');
  } catch {
    // The line is down: the input stays what it is, and asks again.
  }
  return parts;
}

/**
 * The locator's list once its code is here, null before: an input alone can be typed into meanwhile. When the list
 * takes over, the focus and the caret pass from the input in `place` to its successor.
 */
export function useLateParts(place: RefObject<HTMLElement | null>): Parts | null {
  const [held, hold] = useState(parts);
  useEffect(() => {
    if (held) return undefined;
    let isMounted = true;
    let timer: ReturnType<typeof setTimeout> | undefined;
    const ask = async () => {
      const fetched = await fetchParts();
      if (!isMounted) return;
      if (fetched === null) {
        timer = setTimeout(() => void ask(), againAfterMilliseconds);
        return;
      }
      const before = place.current?.querySelector('input');
      const caret = before && before === document.activeElement ? before.selectionStart : null;
      flushSync(() => hold(fetched));
      if (caret === null) return;
      const after = place.current?.querySelector('input');
      after?.focus();
      after?.setSelectionRange(caret, caret);
    };
    void ask();
    return () => {
      isMounted = false;
      clearTimeout(timer);
    };
  }, [held, place]);
  return held;
}

/** What is typed before the list is here, and whether Enter was pressed on it. */
export interface EarlyEntry extends LocatorEntry {
  asks: boolean;
}

export function useEarlyEntry(initialText = ''): EarlyEntry {
  const [{ text, asks }, set] = useState({ text: initialText, asks: false });
  return {
    text,
    asks,
    write: (next) => set({ text: next, asks: false }),
    ask: () => set({ text, asks: true }),
  };
}
