import { useEffect, useState } from 'react';
import { useConnection } from '@/client/use-live';

/** What is said about the line to the server: nothing while it holds. */
export type LineNews = { kind: 'none' } | { kind: 'away'; since: string } | { kind: 'back' };

/** A short gap is nobody's business. */
const quietMilliseconds = 1500;
const backShownMilliseconds = 6000;

export function useLineNews(): LineNews {
  const connection = useConnection();
  const [news, setNews] = useState<LineNews>({ kind: 'none' });
  useEffect(() => {
    if (connection === 'away') {
      const since = new Date().toISOString();
      const timer = setTimeout(() => setNews({ kind: 'away', since }), quietMilliseconds);
      return () => clearTimeout(timer);
    }
    if (connection !== 'connected') return undefined;
    setNews((now) => (now.kind === 'away' ? { kind: 'back' } : now));
    const timer = setTimeout(() => setNews({ kind: 'none' }), backShownMilliseconds);
    return () => clearTimeout(timer);
  }, [connection]);
  return news;
}
