import { createServer, type Server as HttpServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { Server } from 'socket.io';
import { Access } from '@/client/access';
import { Realtime } from '@/client/realtime';
import { idOf } from './support/contract-values';

const projectId = idOf(7);
const ines = { id: idOf(900), email: 'ines@lab.example', name: 'Ines' };
const expiresAt = '2026-01-01T00:10:00.000Z';
const until = async (holds: () => boolean) => {
  for (let turn = 0; turn < 1000 && !holds(); turn += 1) await new Promise((done) => setTimeout(done, 5));
  expect(holds()).toBe(true);
};

/** A real server of sockets: takes the tokens it was told, answers joins with its head. */
class Station {
  readonly tokens: string[] = [];
  readonly joins: string[] = [];
  readonly typed: unknown[] = [];
  good = new Set(['t1']);
  head = 5;
  mayJoin = true;
  private readonly http: HttpServer = createServer();
  readonly io = new Server(this.http);

  async open(): Promise<string> {
    this.io.use((socket, next) => {
      const token = String(socket.handshake.auth.token);
      this.tokens.push(token);
      next(this.good.has(token) ? undefined : new Error('sign-in-needed'));
    });
    this.io.on('connection', (socket) => {
      socket.on(
        'project:join',
        ({ projectId: id }: { projectId: string }, reply: (answer: object) => void) => {
          this.joins.push(id);
          reply(this.mayJoin ? { head: this.head } : { refused: 'not-found' });
        },
      );
      socket.on('project:typing', (body: unknown) => this.typed.push(body));
    });
    await new Promise<void>((done) => this.http.listen(0, '127.0.0.1', done));
    return `http://127.0.0.1:${(this.http.address() as AddressInfo).port}`;
  }

  close(): Promise<void> {
    return new Promise((done) => void this.io.close(() => done()));
  }
}

let station: Station;
let line: Realtime;
let access: Access;
let renewals: number;

beforeEach(async () => {
  station = new Station();
  access = new Access();
  access.accept({ person: ines, accessToken: 't1', expiresAt });
  renewals = 0;
  const renewal = {
    renewAfter: async () => {
      renewals += 1;
      const accessToken = `t${renewals + 1}`;
      station.good.add(accessToken);
      access.accept({ person: ines, accessToken, expiresAt });
      return accessToken;
    },
  };
  line = new Realtime(access, renewal, await station.open());
});
afterEach(async () => {
  line.stop();
  await station.close();
});

test('joins a project once connected and tells how far it is', async () => {
  const heads: [string, number][] = [];
  line.onJoined.subscribe((...joined) => heads.push(joined));
  line.join(projectId);
  line.start();
  await until(() => heads.length === 1);
  expect(heads).toEqual([[projectId, 5]]);
  expect(line.connection()).toBe('connected');
});

test('stopped before the code of the socket is here, it connects no more; started anew, it connects once', async () => {
  line.start();
  line.stop();
  await new Promise((done) => setTimeout(done, 50));
  expect([line.connection(), station.tokens]).toEqual(['off', []]);
  line.start();
  line.stop();
  line.start();
  line.start();
  await until(() => line.connection() === 'connected');
  await new Promise((done) => setTimeout(done, 50));
  expect(station.tokens).toEqual(['t1']);
});

test('cut by the server it renews the token, connects with the new one and joins again', async () => {
  const heads: number[] = [];
  line.onJoined.subscribe((_project, head) => heads.push(head));
  line.join(projectId);
  line.start();
  await until(() => heads.length === 1);
  station.good.delete('t1');
  station.head = 9;
  station.io.disconnectSockets();
  await until(() => heads.length === 2);
  expect(heads).toEqual([5, 9]);
  expect(station.tokens).toEqual(['t1', 't2']);
});

test('refused at the door it renews the token and knocks again', async () => {
  station.good.clear();
  line.start();
  await until(() => line.connection() === 'connected');
  expect(station.tokens).toEqual(['t1', 't2']);
});

test('says when the project is not to be seen', async () => {
  station.mayJoin = false;
  const left: string[] = [];
  line.onLeft.subscribe((id) => left.push(id));
  line.join(projectId);
  line.start();
  await until(() => left.length === 1);
  expect(left).toEqual([projectId]);
});

test('drops packets it cannot read and goes on', async () => {
  const events: number[] = [];
  line.onEvent.subscribe((event) => events.push(event.eventNumber));
  line.onEvent.subscribe(() => {
    throw new Error('a listener that fails');
  });
  jest.spyOn(console, 'error').mockImplementation(() => {});
  line.start();
  await until(() => line.connection() === 'connected');
  const event = {
    projectId,
    eventNumber: 3,
    kind: 'upload.changed',
    subjectId: idOf(1),
    actor: { id: ines.id, name: 'Ines' },
    at: expiresAt,
    payload: null,
  };
  station.io.emit('project:event', null);
  station.io.emit('project:event', { ...event, eventNumber: 'three' });
  station.io.emit('project:left', undefined);
  station.io.emit('project:event', event);
  station.io.emit('project:event', { ...event, eventNumber: 4 });
  await until(() => events.length === 2);
  expect(events).toEqual([3, 4]);
});

test('shows who is here and who types; while the line is down presence stays as it was and says so', async () => {
  line.join(projectId);
  line.start();
  await until(() => line.connection() === 'connected');
  const person = { id: ines.id, name: 'Ines' };
  station.io.emit('project:presence', { projectId, people: [person] });
  station.io.emit('project:typing', { projectId, subjectKey: 'mutant:1', person });
  await until(() => line.people.typistsOf(projectId, 'mutant:1').length === 1);
  expect(line.people.presenceOf(projectId)).toMatchObject({ people: [person], live: true });
  line.people.wrote(projectId, 'mutant:1', person.id);
  expect(line.people.typistsOf(projectId, 'mutant:1')).toEqual([]);
  station.good.clear();
  station.io.disconnectSockets();
  await until(() => line.connection() === 'away');
  expect(line.people.presenceOf(projectId)).toMatchObject({ people: [person], live: false });
});

test('says that one types at most every two seconds', async () => {
  line.join(projectId);
  line.start();
  await until(() => line.connection() === 'connected');
  for (let key = 0; key < 20; key += 1) line.type(projectId, 'mutant:1');
  await until(() => station.typed.length > 0);
  await new Promise((done) => setTimeout(done, 30));
  expect(station.typed).toEqual([{ projectId, subjectKey: 'mutant:1' }]);
});

test('leaves a room only when the last screen left it', async () => {
  const [first, second] = [line.join(projectId), line.join(projectId)];
  line.start();
  await until(() => station.joins.length === 1);
  first();
  station.io.disconnectSockets();
  await until(() => station.joins.length === 2);
  second();
  station.io.disconnectSockets();
  await until(() => line.connection() !== 'connected');
  await until(() => line.connection() === 'connected');
  await new Promise((done) => setTimeout(done, 30));
  expect(station.joins).toHaveLength(2);
});
