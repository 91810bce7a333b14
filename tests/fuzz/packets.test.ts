// Odd packets on the socket: one person's nonsense ends at most their own line, never the server.
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { io } from 'socket.io-client';
import { createFreshDatabase } from '@/tests/support/fresh-database';
import { makeProject, signUp } from '@/tests/support/person';
import { between, pick, seeded } from '@/tests/support/random';
import { startServerProcess } from '@/tests/support/server-process';
import { isFull, report, until } from '@/tests/support/size';
import { anything } from './support/random-input';

const seed = Number(process.env.FUZZ_SEED ?? 20260406);
const packets = isFull ? 20_000 : 600;
const random = seeded(seed);

const names = [
  'project:join',
  'project:leave',
  'project:typing',
  'project:event',
  'toString',
  '__proto__',
  '',
];
/** Text that the protocol of the socket reads by itself. */
const raw = [
  '',
  '2',
  '2[]',
  '2["project:join"]',
  '2["project:join",null,null]',
  '21["project:join",{}]',
  '3[]',
  '4{}',
  '0{"token":1}',
  '1',
  '51-["project:join",{"_placeholder":true,"num":0}]',
  '59999-[]',
  '2["project:join",{"_placeholder":true,"num":9}]',
  '2{"a":1}',
  '9',
  '2[1]',
  '2["connect"]',
  '2["disconnect"]',
  '/x,2["a"]',
  '2'.repeat(5000),
  '2["project:typing",',
];

test('random packets', async () => {
  const database = await createFreshDatabase();
  const dataDir = await mkdtemp(path.join(tmpdir(), 'locant-packets-'));
  const server = await startServerProcess({ databaseUrl: database.url, dataDir });
  const { pid } = server;
  const lead = await signUp(server);
  const { id: projectId } = await makeProject(lead);
  const open = () =>
    io(server.origin, {
      auth: { token: lead.token },
      transports: ['websocket'],
      forceNew: true,
      reconnection: false,
    });

  const quiet = open();
  let socket = open();
  try {
    expect(await quiet.timeout(5000).emitWithAck('project:join', { projectId })).toMatchObject({
      head: expect.any(Number),
    });
    let cutOff = 0;
    const began = Date.now();
    for (let sent = 0; sent < packets; sent += 1) {
      // Some packets end the line without a word; every now and then there is a new one anyway.
      if (!socket.connected || sent % 50 === 0) {
        cutOff += socket.connected ? 0 : 1;
        socket.disconnect();
        socket = open();
        await until('a new line is up', () => socket.connected, 5000);
      }
      if (random() < 0.15) {
        socket.io.engine.write(pick(random, raw));
      } else {
        const args = Array.from({ length: between(random, 0, 3) }, () =>
          random() < 0.2
            ? { projectId, subjectKey: anything(random) }
            : random() < 0.1
              ? new Uint8Array(9)
              : anything(random),
        );
        if (random() < 0.3) socket.emit(pick(random, names) || 'x', ...args, () => {});
        else socket.emit(pick(random, names) || 'x', ...args);
      }
      if (sent % 20 === 19) await new Promise((done) => setTimeout(done, 5));
    }
    report(`${packets} packets in ${Date.now() - began} ms, seed ${seed}; ${cutOff} lines cut for them`);
    // The same server still serves, and the other person's line held.
    expect((await fetch(`${server.origin}/readyz`)).status).toBe(200);
    expect(server.pid).toBe(pid);
    expect(quiet.connected).toBe(true);
    expect(await quiet.timeout(5000).emitWithAck('project:join', { projectId })).toMatchObject({
      head: expect.any(Number),
    });
  } finally {
    quiet.disconnect();
    socket.disconnect();
    await server.stop();
    await database.drop();
    await rm(dataDir, { recursive: true, force: true });
  }
});
