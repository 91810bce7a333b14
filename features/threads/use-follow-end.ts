import { useCallback, useLayoutEffect, useRef, useState } from 'react';
import type { ThreadLine } from './thread-lines';

const nearEndPixels = 40;

/**
 * Keeps a log where its reader is: at the end it follows what arrives, elsewhere nothing moves and what arrived is
 * counted. Earlier messages put before the others leave in place what is read.
 */
export function useFollowEnd(lines: readonly ThreadLine[], ownId: string | undefined) {
  const ref = useRef<HTMLDivElement>(null);
  const atEnd = useRef(true);
  const seen = useRef({ firstKey: '', lastKey: '', heightPixels: 0 });
  const [unseen, setUnseen] = useState(0);

  const toEnd = useCallback(() => {
    const log = ref.current;
    if (log) log.scrollTop = log.scrollHeight;
    atEnd.current = true;
    setUnseen(0);
  }, []);
  const onScroll = useCallback(() => {
    const log = ref.current;
    if (!log) return;
    atEnd.current = log.scrollHeight - log.scrollTop - log.clientHeight < nearEndPixels;
    if (atEnd.current) setUnseen(0);
  }, []);

  useLayoutEffect(() => {
    const log = ref.current;
    const before = seen.current;
    const firstKey = lines[0]?.key ?? '';
    const lastKey = lines.at(-1)?.key ?? '';
    seen.current = { firstKey, lastKey, heightPixels: log?.scrollHeight ?? 0 };
    if (!log) return;
    const isFirst = before.lastKey === '';
    const place = lines.findIndex(({ key }) => key === before.lastKey);
    const arrived = isFirst || place < 0 ? [] : lines.slice(place + 1);
    const isOwn = arrived.some((line) => line.state !== 'stored' || line.message.by.id === ownId);
    if (isFirst || atEnd.current || isOwn) {
      toEnd();
      return;
    }
    if (firstKey !== before.firstKey) log.scrollTop += log.scrollHeight - before.heightPixels;
    if (arrived.length > 0) setUnseen((count) => count + arrived.length);
  }, [lines, ownId, toEnd]);

  // A text drawn later, such as markdown or a picture, makes the log taller: at the end it stays at the end.
  useLayoutEffect(() => {
    const log = ref.current;
    const content = log?.firstElementChild;
    if (!log || !content || typeof ResizeObserver === 'undefined') return undefined;
    const observer = new ResizeObserver(() => {
      if (atEnd.current) log.scrollTop = log.scrollHeight;
      seen.current.heightPixels = log.scrollHeight;
    });
    observer.observe(content);
    return () => observer.disconnect();
  }, []);

  return { ref, onScroll, unseen, toEnd };
}
