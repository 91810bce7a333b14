import type { Server } from 'node:http';

const patienceMilliseconds = 8000;

/** Stops taking requests, lets those under way end, closes the rest, and goes; a second signal goes at once. */
export function endOnSignals(http: Server, close: () => Promise<void>): void {
  let isEnding = false;
  const end = async () => {
    if (isEnding) process.exit(1);
    isEnding = true;
    setTimeout(() => process.exit(1), patienceMilliseconds).unref();
    // A kept-alive connection would hold the server open for seconds.
    http.on('request', (_request, response) => response.setHeader('Connection', 'close'));
    http.close();
    http.closeIdleConnections();
    await close();
    process.exit(0);
  };
  process.on('SIGTERM', () => void end());
  process.on('SIGINT', () => void end());
}
