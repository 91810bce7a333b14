import type { IncomingMessage } from 'node:http';

/**
 * Browsers name the page a request comes from. Only our own pages (and those configured) may open a socket or renew
 * a session; a request without an Origin comes from no page.
 */
export function originAllowed(request: IncomingMessage, allowed: readonly string[]): boolean {
  const origin = request.headers.origin;
  if (!origin) return true;
  if (allowed.includes(origin)) return true;
  try {
    return new URL(origin).host === request.headers.host;
  } catch {
    return false;
  }
}
