// A line to the database that can be cut and mended, as when it is stopped and started again.
import { connect, createServer, type AddressInfo, type Socket } from 'node:net';

export interface CutLine {
  /** The same database, through the line. */
  url: string;
  cut(): void;
  mend(): void;
  close(): Promise<void>;
}

export async function cutLine(databaseUrl: string): Promise<CutLine> {
  const target = new URL(databaseUrl);
  const open = new Set<Socket>();
  let isCut = false;
  const server = createServer((near) => {
    if (isCut) return void near.destroy();
    const far = connect(Number(target.port), target.hostname);
    for (const [one, other] of [
      [near, far],
      [far, near],
    ] as const) {
      open.add(one);
      one.pipe(other);
      one.on('error', () => other.destroy());
      one.on('close', () => {
        open.delete(one);
        other.destroy();
      });
    }
  });
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
  const url = new URL(databaseUrl);
  url.hostname = '127.0.0.1';
  url.port = String((server.address() as AddressInfo).port);
  const cut = () => {
    isCut = true;
    for (const socket of open) socket.destroy();
  };
  return {
    url: url.toString(),
    cut,
    mend() {
      isCut = false;
    },
    async close() {
      cut();
      await new Promise((done) => server.close(done));
    },
  };
}
