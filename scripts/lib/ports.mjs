// Ports on the loopback address.
import net from 'node:net';

/** True when nothing listens there. */
export function isPortFree(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const server = net.createServer();
    server.once('error', () => resolve(false));
    server.listen({ port, host, exclusive: true }, () => server.close(() => resolve(true)));
  });
}

/** Any free port, as the system gives it. */
export function anyFreePort() {
  return new Promise((resolve, reject) => {
    const server = net.createServer();
    server.once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const { port } = server.address();
      server.close(() => resolve(port));
    });
  });
}

/** The first free port from the given one upwards. */
export async function nextFreePort(first, host) {
  for (let port = first; port < first + 100; port += 1) {
    if (await isPortFree(port, host)) return port;
  }
  throw new Error(`No free port between ${first} and ${first + 99}.`);
}
