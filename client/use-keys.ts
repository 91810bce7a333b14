import { useEffect, useRef } from 'react';
import { tinykeys } from 'tinykeys';

type Bindings = Readonly<Record<string, (event: KeyboardEvent) => void>>;

const isTyping = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement &&
  (target.isContentEditable || ['INPUT', 'TEXTAREA', 'SELECT'].includes(target.tagName));

/** A key that somebody else took, that is typed into a field, or pressed under an open dialog, is left alone. */
const isElsewhere = (event: KeyboardEvent): boolean =>
  event.defaultPrevented || isTyping(event.target) || document.querySelector('dialog[open]') !== null;

/** Signs such as `/` and `[` stand on other keys elsewhere, often with Shift: what is typed counts, not the key. */
const spellings = (key: string): string[] => (/^[^\p{L}\s]$/u.test(key) ? [key, `Shift+${key}`] : [key]);

/** Single keys that work anywhere on the page while mounted. */
export function useKeys(bindings: Bindings): void {
  const latest = useRef(bindings);
  useEffect(() => {
    latest.current = bindings;
  });
  const keys = Object.keys(bindings).join(' ');
  useEffect(() => {
    if (typeof window === 'undefined' || keys === '') return undefined;
    const listen = (key: string) => (event: KeyboardEvent) => {
      if (isElsewhere(event)) return;
      event.preventDefault();
      latest.current[key]?.(event);
    };
    const all = keys.split(' ').flatMap((key) => spellings(key).map((one) => [one, listen(key)] as const));
    return tinykeys(window, Object.fromEntries(all));
  }, [keys]);
}
