// A browser's end of the socket, for tests: what it heard, in order.
import { io, type Socket } from 'socket.io-client';
import type { ClientToServer, ProjectEvent, ServerToClient } from '@/shared/contracts';
import type { TestServer } from './server';

type LiveSocket = Socket<ServerToClient, ClientToServer>;

interface Options {
  origin?: string;
  transport?: 'websocket' | 'polling';
}

export class LiveClient {
  readonly events: ProjectEvent[] = [];
  readonly left: string[] = [];
  readonly typing: { subjectKey: string; by: string }[] = [];
  people: string[] = [];
  refusal: string | null = null;
  private readonly changes = new Set<() => void>();

  private constructor(readonly socket: LiveSocket) {
    const changed = () => this.changes.forEach((check) => check());
    socket.on('project:event', (event) => {
      this.events.push(event);
      changed();
    });
    socket.on('project:left', ({ projectId }) => {
      this.left.push(projectId);
      changed();
    });
    socket.on('project:presence', ({ people }) => {
      this.people = people.map(({ name }) => name);
      changed();
    });
    socket.on('project:typing', ({ subjectKey, person }) => {
      this.typing.push({ subjectKey, by: person.id });
      changed();
    });
    socket.on('connect', changed);
    socket.on('disconnect', changed);
    socket.on('connect_error', (error) => {
      this.refusal = error.message;
      changed();
    });
  }

  /** Connects, or is refused; either is waited for. */
  static async open(server: TestServer, token: unknown, { origin, transport = 'websocket' }: Options = {}) {
    const client = new LiveClient(
      io(server.origin, {
        auth: { token },
        transports: [transport],
        reconnection: false,
        forceNew: true,
        ...(origin && { extraHeaders: { origin } }),
      }),
    );
    await client.until(() => client.socket.connected || client.refusal !== null);
    return client;
  }

  join(projectId: string): Promise<{ head: number } | { refused: string }> {
    return this.socket.timeout(3000).emitWithAck('project:join', { projectId });
  }

  /** Waits until it holds; how long that took, in milliseconds. */
  async until(holds: () => boolean, milliseconds = 3000): Promise<number> {
    const begun = performance.now();
    await new Promise<void>((done, fail) => {
      const check = () => {
        if (!holds()) return;
        clearTimeout(timer);
        this.changes.delete(check);
        done();
      };
      const timer = setTimeout(() => {
        this.changes.delete(check);
        fail(new Error(`It did not come to hold within ${milliseconds} ms: ${String(holds)}`));
      }, milliseconds);
      this.changes.add(check);
      check();
    });
    return performance.now() - begun;
  }

  get isOpen(): boolean {
    return this.socket.connected;
  }

  close(): void {
    this.socket.close();
  }
}
