import { QueryClientProvider } from '@tanstack/react-query';
import { useEffect, type ReactNode } from 'react';
import { queryClient } from './query-client';
import { startClient } from './start-client';

/** Around the whole app: what was read from the server, the session, the socket and the outbox. */
export function ClientProvider({ children }: { children: ReactNode }) {
  useEffect(startClient, []);
  return <QueryClientProvider client={queryClient}>{children}</QueryClientProvider>;
}
