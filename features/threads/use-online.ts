import { useSyncExternalStore } from 'react';
import { useConnection } from '@/client/use-live';

const subscribe = (listen: () => void) => {
  window.addEventListener('online', listen);
  window.addEventListener('offline', listen);
  return () => {
    window.removeEventListener('online', listen);
    window.removeEventListener('offline', listen);
  };
};
const browserIsOnline = (): boolean => navigator.onLine !== false;

/** Whether a message would go out at once: the line is up, and the browser does not say otherwise. */
export function useOnline(): boolean {
  const browser = useSyncExternalStore(subscribe, browserIsOnline, () => true);
  return useConnection() === 'connected' && browser;
}
