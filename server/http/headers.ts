import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import helmet from 'helmet';

/** Hashes of the two inline styles that the build and the style sheet engine bring; written by the build. */
function styleHashes(folder: string): string[] {
  const file = path.join(folder, 'csp.json');
  if (!existsSync(file)) return [];
  const { styles } = JSON.parse(readFileSync(file, 'utf8')) as { styles?: string[] };
  return (styles ?? []).map((hash) => `'${hash}'`);
}

/** Scripts only from here, no plug-ins, no framing; plain http on a local network stays usable. */
export function securityHeaders(clientFolder: string) {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'", ...styleHashes(clientFolder)],
        // Elements carry computed styles (a width, a place on a scale); rules do not.
        styleSrcAttr: ["'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'", 'ws:', 'wss:'],
        workerSrc: ["'self'", 'blob:'],
        objectSrc: ["'none'"],
        baseUri: ["'self'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
      },
    },
    strictTransportSecurity: false,
    crossOriginOpenerPolicy: false,
    originAgentCluster: false,
    referrerPolicy: { policy: 'no-referrer' },
  });
}
