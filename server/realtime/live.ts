import type { Server as HttpServer } from 'node:http';
import { Server, type Socket } from 'socket.io';
import {
  joinBody,
  typingBody,
  type ClientToServer,
  type PersonBrief,
  type ServerToClient,
} from '../../shared/contracts';
import type { AnnouncedEvent } from '../db';
import { originAllowed, type AccessClaims, type Authenticate } from '../http';
import type { Logger } from '../lib/log';
import { notFound } from '../lib/problem';
import type { PeopleDirectory, SessionService } from '../modules/auth';
import type { ProjectAccess, ProjectQueries } from '../modules/projects';
import { Presence } from './presence';

interface SocketData {
  claims: AccessClaims;
  person: PersonBrief;
}
type LiveServer = Server<ClientToServer, ServerToClient, Record<string, never>, SocketData>;
type LiveSocket = Socket<ClientToServer, ServerToClient, Record<string, never>, SocketData>;

interface Parts {
  authenticate: Authenticate;
  sessions: SessionService;
  people: PeopleDirectory;
  access: ProjectAccess;
  queries: ProjectQueries;
  allowedOrigins: readonly string[];
  log: Logger;
}

const projectRoom = (projectId: string) => `project:${projectId}`;
const personRoom = (personId: string) => `person:${personId}`;
const sessionRoom = (familyId: string) => `session:${familyId}`;
const heartbeatMilliseconds = 5000;

/**
 * The socket carries facts out; writes come over HTTP. What counts is the event cursor in the database: everything
 * sent here may be lost, and the client asks for what it missed.
 */
export class Live {
  private readonly io: LiveServer;
  private readonly presence = new Presence();
  private readonly heartbeat: NodeJS.Timeout;
  /** Events of one project go out in the order of their numbers. */
  private readonly outgoing = new Map<string, Promise<void>>();

  constructor(
    http: HttpServer,
    private readonly parts: Parts,
  ) {
    this.io = new Server(http, {
      path: '/socket.io',
      serveClient: false,
      maxHttpBufferSize: 64_000,
      pingInterval: 10_000,
      pingTimeout: 8_000,
      allowRequest: (request, done) => done(null, originAllowed(request, parts.allowedOrigins)),
    });
    this.io.use((socket, next) => {
      this.admit(socket).then(
        () => next(),
        () => next(new Error('sign-in-needed')),
      );
    });
    this.io.on('connection', (socket) => this.welcome(socket));
    this.heartbeat = setInterval(() => void this.beat(), heartbeatMilliseconds);
    this.heartbeat.unref();
  }

  /** After a commit. */
  publish(events: readonly AnnouncedEvent[]): void {
    const projectId = events[0]?.projectId;
    if (!projectId) return;
    const before = this.outgoing.get(projectId) ?? Promise.resolve();
    const sent = before.then(async () => {
      for (const event of await this.parts.queries.present(events)) {
        this.io.to(projectRoom(projectId)).emit('project:event', event);
        if (event.kind === 'member.removed') this.putOut(event.subjectId, projectId);
      }
    });
    const settled = sent.catch((error: unknown) => this.parts.log.warn({ err: error }, 'events not sent'));
    this.outgoing.set(projectId, settled);
    void settled.then(() => {
      if (this.outgoing.get(projectId) === settled) this.outgoing.delete(projectId);
    });
  }

  hintProgress(progress: Parameters<ServerToClient['upload:progress']>[0]): void {
    this.io.to(projectRoom(progress.projectId)).volatile.emit('upload:progress', progress);
  }

  /** A sign-in ended: its sockets end with it. */
  cutSession(sessionFamilyId: string): void {
    this.io.in(sessionRoom(sessionFamilyId)).disconnectSockets(true);
  }

  async close(): Promise<void> {
    clearInterval(this.heartbeat);
    await this.io.close();
  }

  private async admit(socket: LiveSocket): Promise<void> {
    const token: unknown = (socket.handshake.auth as { token?: unknown }).token;
    const claims = typeof token === 'string' ? this.parts.authenticate.verify(token) : null;
    if (!claims || !(await this.parts.sessions.isOpen(claims.sessionFamilyId)))
      throw new Error('sign-in-needed');
    const person = (await this.parts.people.briefs([claims.personId]))(claims.personId);
    socket.data = { claims, person };
  }

  private welcome(socket: LiveSocket): void {
    const { claims, person } = socket.data;
    void socket.join([personRoom(claims.personId), sessionRoom(claims.sessionFamilyId)]);
    const expiry = setTimeout(() => socket.disconnect(true), claims.expiresAt.getTime() - Date.now());
    socket.on('project:join', (body, reply) => {
      if (typeof reply !== 'function') return;
      const parsed = joinBody.safeParse(body);
      if (!parsed.success) return reply({ refused: 'Which project?' });
      this.join(socket, parsed.data.projectId).then(reply, () =>
        reply({ refused: 'There is no such project, or you may not see it.' }),
      );
    });
    socket.on('project:leave', (body) => {
      const parsed = joinBody.safeParse(body);
      if (parsed.success && socket.rooms.has(projectRoom(parsed.data.projectId)))
        this.leave(socket, parsed.data.projectId);
    });
    socket.on('project:typing', (body) => {
      const parsed = typingBody.safeParse(body);
      if (!parsed.success || !socket.rooms.has(projectRoom(parsed.data.projectId))) return;
      socket
        .to(projectRoom(parsed.data.projectId))
        .volatile.emit('project:typing', { ...parsed.data, person });
    });
    socket.on('disconnect', () => {
      clearTimeout(expiry);
      for (const projectId of this.presence.projectsOf(socket.id)) this.leave(socket, projectId);
    });
  }

  private async join(socket: LiveSocket, projectId: string): Promise<{ head: number }> {
    const personId = socket.data.person.id;
    await this.parts.access.membership(personId, projectId);
    await socket.join(projectRoom(projectId));
    // Removed between the question and the joining: whoever puts people out did not find them yet.
    if (!(await this.parts.access.roleOf(personId, projectId))) {
      await socket.leave(projectRoom(projectId));
      throw notFound('project');
    }
    if (!socket.connected) return { head: 0 };
    this.presence.add(projectId, socket.id, socket.data.person);
    this.tellPresence(projectId);
    return { head: await this.parts.queries.head(projectId) };
  }

  private leave(socket: LiveSocket, projectId: string): void {
    void socket.leave(projectRoom(projectId));
    this.presence.remove(projectId, socket.id);
    this.tellPresence(projectId);
  }

  private putOut(personId: string, projectId: string): void {
    const theirs = this.io.in(personRoom(personId));
    theirs.emit('project:left', { projectId });
    theirs.socketsLeave(projectRoom(projectId));
    for (const socket of this.io.of('/').sockets.values()) {
      if (socket.data.person.id === personId) this.presence.remove(projectId, socket.id);
    }
    this.tellPresence(projectId);
  }

  private tellPresence(projectId: string): void {
    const people = this.presence.people(projectId);
    this.io.to(projectRoom(projectId)).emit('project:presence', { projectId, people });
  }

  /** Tells each open project how far it is, and puts out whoever lost the membership in another process. */
  private async beat(): Promise<void> {
    for (const projectId of this.presence.open) {
      try {
        const head = await this.parts.queries.head(projectId);
        this.io.to(projectRoom(projectId)).emit('project:head', { projectId, head });
        for (const person of this.presence.people(projectId)) {
          if (!(await this.parts.access.roleOf(person.id, projectId))) this.putOut(person.id, projectId);
        }
      } catch (error) {
        this.parts.log.warn({ err: error }, 'no heartbeat');
      }
    }
  }
}
