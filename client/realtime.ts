import type { io as openSocket, Socket } from 'socket.io-client';
import { projectEvent, type ProjectEvent } from '@/shared/contracts/projects';
import { uploadProgress } from '@/shared/contracts/uploads';
import {
  headBody,
  presence,
  typing,
  type ClientToServer,
  type ServerToClient,
} from '@/shared/contracts/live';
import { id } from '@/shared/contracts/common';
import { access, type Access } from './access';
import { api, type Api } from './api';
import { Emitter } from './emitter';
import { LivePeople } from './live-people';
import { backoffMilliseconds, Pause } from './wait';

export type Connection = 'off' | 'connecting' | 'connected' | 'away';
export type UploadHint = { projectId: string; uploadId: string; stage: string; done: number; total: number };

const joinPatienceMilliseconds = 10_000;
const steadyAfterMilliseconds = 60_000;
const typingEveryMilliseconds = 2000;
const waits = { firstMilliseconds: 500, mostMilliseconds: 8000 };

/** The only socket. It carries facts that are stored and hints that are not; writes go over HTTP. */
export class Realtime {
  readonly people = new LivePeople();
  readonly onEvent = new Emitter<[ProjectEvent]>();
  readonly onHead = new Emitter<[projectId: string, head: number]>();
  readonly onJoined = new Emitter<[projectId: string, head: number]>();
  /** The project is not (any more) to be seen by this person. */
  readonly onLeft = new Emitter<[projectId: string]>();
  readonly onUploadHint = new Emitter<[UploadHint]>();
  readonly onConnection = new Emitter<[]>();
  private socket: Socket<ServerToClient, ClientToServer> | null = null;
  /** From start to stop; another start is another run. */
  private run: object | null = null;
  private state: Connection = 'off';
  private readonly joined = new Map<string, number>();
  private readonly lastTyped = new Map<string, number>();
  private readonly pause = new Pause();
  private refusals = 0;
  private connectedAt = 0;

  constructor(
    private readonly access: Access,
    private readonly renewal: Api['renewal'],
    private readonly address?: string,
  ) {}

  readonly connection = (): Connection => this.state;

  start(): void {
    if (this.run) return;
    const run = {};
    this.run = run;
    this.become('connecting');
    void this.fetchAndConnect(run);
  }

  /** The socket's own code comes after the sign-in, so that no page waits for it. */
  private async fetchAndConnect(run: object): Promise<void> {
    for (let failures = 0; this.run === run; failures += 1) {
      const code = await import('socket.io-client').catch(() => null);
      if (this.run !== run) return;
      if (code) return this.connect(code.io);
      this.become('away');
      await this.pause.wait(backoffMilliseconds(failures, waits));
    }
  }

  private connect(io: typeof openSocket): void {
    const options = {
      // Asked at each connect: the token of now, not of then.
      auth: (give: (data: object) => void) => give({ token: this.access.token }),
      transports: ['websocket', 'polling'],
      tryAllTransports: true,
      reconnectionDelay: waits.firstMilliseconds,
      reconnectionDelayMax: waits.mostMilliseconds,
      randomizationFactor: 0.9,
      forceNew: true,
    };
    const socket: Socket<ServerToClient, ClientToServer> = this.address
      ? io(this.address, options)
      : io(options);
    this.socket = socket;
    socket.on('connect', () => {
      this.connectedAt = Date.now();
      this.become('connected');
      for (const projectId of this.joined.keys()) void this.ask(projectId);
    });
    socket.on('disconnect', () => {
      if (this.socket !== socket) return;
      this.people.freeze();
      this.become('away');
      // Cut by the server: it won't reconnect by itself, and the token may be the reason.
      if (!socket.active) void this.knock(socket);
    });
    socket.on('connect_error', () => {
      if (this.socket !== socket) return;
      this.become('away');
      if (!socket.active) void this.knock(socket);
    });
    this.listen(socket);
  }

  stop(): void {
    const socket = this.socket;
    this.socket = null;
    this.run = null;
    this.pause.wake();
    socket?.disconnect();
    this.people.clear();
    this.become('off');
  }

  /** The line may be back: don't wait for the clock. */
  retryNow(): void {
    this.pause.wake();
    // Connecting anew ends the wait between two tries.
    if (this.socket && !this.socket.connected && this.socket.active) this.socket.disconnect().connect();
  }

  /** Stays in the project's room until the returned function is called. */
  join(projectId: string): () => void {
    const count = this.joined.get(projectId) ?? 0;
    this.joined.set(projectId, count + 1);
    if (count === 0) void this.ask(projectId);
    return () => this.leave(projectId);
  }

  /** Tells the others that one types; at most every two seconds. */
  type(projectId: string, subjectKey: string): void {
    const place = `${projectId}/${subjectKey}`;
    const now = Date.now();
    if (now - (this.lastTyped.get(place) ?? 0) < typingEveryMilliseconds) return;
    this.lastTyped.set(place, now);
    if (this.socket?.connected) this.socket.emit('project:typing', { projectId, subjectKey });
  }

  private leave(projectId: string): void {
    const count = (this.joined.get(projectId) ?? 1) - 1;
    if (count > 0) {
      this.joined.set(projectId, count);
      return;
    }
    this.joined.delete(projectId);
    this.people.forget(projectId);
    if (this.socket?.connected) this.socket.emit('project:leave', { projectId });
  }

  private async ask(projectId: string): Promise<void> {
    const socket = this.socket;
    if (!socket?.connected) return;
    try {
      const answer = await socket
        .timeout(joinPatienceMilliseconds)
        .emitWithAck('project:join', { projectId });
      if (!this.joined.has(projectId)) socket.emit('project:leave', { projectId });
      else if ('head' in answer) this.onJoined.emit(projectId, answer.head);
      else this.onLeft.emit(projectId);
    } catch {
      if (socket.connected && this.joined.has(projectId)) await this.ask(projectId);
    }
  }

  /** A new token, then a new connection, after a random and growing wait. */
  private async knock(socket: Socket<ServerToClient, ClientToServer>): Promise<void> {
    // A line that held for a while was a good one; one that is cut at once is a refusal too.
    this.refusals = Date.now() - this.connectedAt < steadyAfterMilliseconds ? this.refusals + 1 : 0;
    await this.pause.wait(backoffMilliseconds(this.refusals, waits));
    if (this.socket !== socket) return;
    try {
      await this.renewal.renewAfter(this.access.token);
    } catch {
      if (this.access.read().status === 'signed out') return;
    }
    if (this.socket === socket && !socket.active) socket.connect();
  }

  private listen(socket: Socket<ServerToClient, ClientToServer>): void {
    // What cannot be read is dropped: the next head shows what is missing.
    socket.on('project:event', (body) => {
      const event = projectEvent.safeParse(body);
      if (event.success) this.onEvent.emit(event.data);
    });
    socket.on('project:head', (body) => {
      const head = headBody.safeParse(body);
      if (head.success) this.onHead.emit(head.data.projectId, head.data.head);
    });
    socket.on('project:left', (body) => {
      const left = id.safeParse(body?.projectId);
      if (left.success) this.onLeft.emit(left.data);
    });
    socket.on('project:presence', (body) => {
      const here = presence.safeParse(body);
      if (here.success) this.people.here(here.data.projectId, here.data.people);
    });
    socket.on('project:typing', (body) => {
      const typist = typing.safeParse(body);
      if (typist.success) this.people.types(typist.data);
    });
    socket.on('upload:progress', (body) => {
      const hint = uploadProgress.extend({ projectId: id }).safeParse(body);
      if (hint.success) this.onUploadHint.emit(hint.data);
    });
  }

  private become(state: Connection): void {
    if (state === this.state) return;
    this.state = state;
    this.onConnection.emit();
  }
}

export const realtime = new Realtime(access, api.renewal);
