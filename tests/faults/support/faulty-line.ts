// The line between one person and the server: TCP that can be slow, be cut, lose a request or lose a reply.
import net, { type AddressInfo, type Socket } from 'node:net';
import { between } from '@/tests/support/random';

export interface LineCounts {
  cuts: number;
  requestsLost: number;
  repliesLost: number;
  /** Replies lost that said that the server had written what it was asked to. */
  donesLost: number;
}

export class FaultyLine {
  /** Chance that one packet is lost with its connection, either way. */
  loss = 0;
  readonly counts: LineCounts = { cuts: 0, requestsLost: 0, repliesLost: 0, donesLost: 0 };
  private readonly open = new Set<Socket>();
  private downUntil = 0;
  private readonly server = net.createServer((near) => this.connect(near));

  private constructor(
    private readonly serverPort: number,
    private readonly random: () => number,
  ) {}

  static async to(serverPort: number, random: () => number): Promise<FaultyLine> {
    const line = new FaultyLine(serverPort, random);
    await new Promise<void>((done) => line.server.listen(0, '127.0.0.1', done));
    return line;
  }

  get origin(): string {
    return `http://127.0.0.1:${(this.server.address() as AddressInfo).port}`;
  }

  /** Cuts what is open and takes nothing for a while. */
  cut(milliseconds: number): void {
    this.counts.cuts += 1;
    this.downUntil = Date.now() + milliseconds;
    for (const socket of this.open) socket.destroy();
  }

  async close(): Promise<void> {
    this.cut(0);
    await new Promise((done) => this.server.close(done));
  }

  private connect(near: Socket): void {
    if (Date.now() < this.downUntil) {
      near.on('error', () => {});
      near.destroy();
      return;
    }
    const far = net.connect(this.serverPort, '127.0.0.1');
    const latency = between(this.random, 0, 25);
    this.join(near, far, latency, () => (this.counts.requestsLost += 1));
    this.join(far, near, latency, (chunk) => {
      this.counts.repliesLost += 1;
      if (chunk.subarray(0, 12).toString('latin1') === 'HTTP/1.1 201') this.counts.donesLost += 1;
    });
  }

  private join(from: Socket, to: Socket, latency: number, onLost: (chunk: Buffer) => void): void {
    this.open.add(from);
    from.setNoDelay(true);
    from.on('error', () => {});
    from.on('close', () => {
      this.open.delete(from);
      to.destroy();
    });
    from.on('data', (chunk: Buffer) => {
      if (this.random() < this.loss) {
        onLost(chunk);
        from.destroy();
        to.destroy();
        return;
      }
      // The same for the whole connection, so that its packets stay in order.
      setTimeout(() => to.destroyed || to.write(chunk), latency);
    });
  }
}
