import { randomUUID } from 'node:crypto';
import {
  annotations,
  families,
  maps,
  plans,
  projects,
  structures,
  teams,
  threads,
  type Endpoint,
} from '@/shared/contracts';
import { askAny, stageFull, type Full } from '@/tests/support/access-stage';
import { addMember } from '@/tests/support/person';
import { startTestServer, type TestServer } from '@/tests/support/server';
import { pinAt, type Stage } from '@/tests/support/stage';

let server: TestServer;
let full: Full;
let stage: Stage;
beforeAll(async () => {
  server = await startTestServer();
  full = await stageFull(server);
  stage = full.stage;
});
afterAll(() => server.close());

const subject = () => ({
  kind: 'residue' as const,
  proteinId: stage.protein('ATPE_ECOLI').id,
  residueIndex: 60,
});

test('fifty at once: every message gets its own number, without gaps', async () => {
  const { lead, projectId } = stage;
  const { head } = await lead.must(projects.read, { params: { projectId } });
  const posted = await Promise.all(
    Array.from({ length: 50 }, (_, at) =>
      lead.must(threads.post, {
        params: { projectId },
        body: { clientKey: randomUUID(), subject: subject(), text: `Message ${at}` },
      }),
    ),
  );
  const numbers = posted.map(({ message }) => message.eventNumber).sort((one, other) => one - other);
  expect(numbers).toEqual(Array.from({ length: 50 }, (_, at) => head + 1 + at));
  const { events } = await lead.must(projects.events, { params: { projectId }, query: { after: head } });
  expect(events.map(({ eventNumber }) => eventNumber)).toEqual(numbers);
});

test('events are numbered without gaps from the first, whatever was written', async () => {
  const { lead, projectId } = stage;
  const { events, head } = await lead.must(projects.events, { params: { projectId }, query: { after: 0 } });
  expect(events.map(({ eventNumber }) => eventNumber)).toEqual(
    Array.from({ length: head }, (_, at) => at + 1),
  );
});

const of = <More extends object>(more = {} as More) => ({ params: { projectId: stage.projectId, ...more } });
const content = {
  kind: 'ion site' as const,
  text: 'Carries the ion.',
  confidence: 'high' as const,
  evidence: [{ kind: 'coordinates' as const, reference: 'PDB 4BEM' }],
};
const pin = () => ({
  ...of(),
  body: { pins: [{ proteinId: stage.protein('ATPE_ECOLI').id, residueIndex: 60 }], ...content },
});
const count = async (table: string): Promise<number> => {
  const [row] = await server.container.source.query(`SELECT COUNT(*) AS rows_there FROM ${table}`);
  return Number((row as { rows_there: string }).rows_there);
};

test('a unit inside a unit is refused at once, where it would wait for itself', async () => {
  const { unitOfWork } = server.container;
  const scope = { projectId: stage.projectId, actorId: stage.lead.id };
  const nested = unitOfWork.write(scope, () => unitOfWork.write(scope, async () => 'never'));
  await expect(nested).rejects.toThrow('A unit of work cannot begin inside another.');
  // The project goes on.
  expect(await unitOfWork.write(scope, async () => 'done')).toBe('done');
});

test('what is read inside a unit is read on its own connection, with what it wrote', async () => {
  const { unitOfWork } = server.container;
  const scope = { projectId: stage.projectId, actorId: stage.lead.id };
  const name = `Motor ${randomUUID()}`;
  const nameNow = async () => {
    const [row] = await unitOfWork.reader.query('SELECT name FROM project WHERE id = ?', [stage.projectId]);
    return (row as { name: string }).name;
  };
  const undone = unitOfWork.write(scope, async ({ manager }) => {
    await manager.query('UPDATE project SET name = ? WHERE id = ?', [name, stage.projectId]);
    expect(await nameNow()).toBe(name);
    throw new Error('undone');
  });
  await expect(undone).rejects.toThrow('undone');
  expect(await nameNow()).not.toBe(name);
});

describe('a request that carries its own key', () => {
  test('asked again, is answered the same and done once', async () => {
    const key = randomUUID();
    const before = await count('annotation');
    const first = await stage.lead.must(annotations.make, { ...pin(), key });
    const again = await stage.lead.must(annotations.make, { ...pin(), key });
    expect(again).toEqual(first);
    expect(await count('annotation')).toBe(before + 1);
  });

  test('is the same key in capitals', async () => {
    const key = randomUUID();
    const first = await stage.lead.must(annotations.make, { ...pin(), key });
    expect(await stage.lead.must(annotations.make, { ...pin(), key: key.toUpperCase() })).toEqual(first);
  });

  test('is refused with another body, another address or another version under the key', async () => {
    const key = randomUUID();
    const { id, version } = await stage.lead.must(annotations.make, { ...pin(), key });
    const body = { ...pin().body, text: 'Something else.' };
    const edit = { ...of({ annotationId: id }), body: content };
    const editKey = randomUUID();
    await stage.lead.must(annotations.edit, { ...edit, version, key: editKey });
    const answers = await Promise.all([
      stage.lead.ask(annotations.make, { ...of(), body, key }),
      stage.lead.ask(teams.make, { body: { name: 'A team' }, key }),
      stage.lead.ask(annotations.edit, { ...edit, version: version + 1, key: editKey }),
    ]);
    expect(answers.map(({ status, body: { code } }) => [status, code])).toEqual(
      answers.map(() => [409, 'key-reused']),
    );
  });

  test('an edit asked again under its key is answered as before, although its version is old by then', async () => {
    const { id, version } = await pinAt(stage, 'ATPE_ECOLI', 60)(stage.lead);
    const edit = { ...of({ annotationId: id }), version, body: content, key: randomUUID() };
    const first = await stage.lead.must(annotations.edit, edit);
    expect(await stage.lead.must(annotations.edit, edit)).toEqual(first);
    const versions = await stage.lead.must(annotations.versions, of({ annotationId: id }));
    expect(versions).toHaveLength(2);
  });

  test('doubled at once, is done once, within a project and outside', async () => {
    const key = randomUUID();
    const teamKey = randomUUID();
    const before = [await count('annotation'), await count('team')];
    const pins = await Promise.all(
      Array.from({ length: 8 }, () => stage.lead.must(annotations.make, { ...pin(), key })),
    );
    const made = await Promise.all(
      Array.from({ length: 8 }, () =>
        stage.lead.must(teams.make, { body: { name: 'A team' }, key: teamKey }),
      ),
    );
    expect(new Set(pins.map(({ id }) => id)).size).toBe(1);
    expect(new Set(made.map(({ id }) => id)).size).toBe(1);
    expect([await count('annotation'), await count('team')]).toEqual(before.map((rows) => rows + 1));
  });

  test('of two people is two requests', async () => {
    const other = await addMember(stage.lead, stage.projectId, 'contributor');
    const key = randomUUID();
    const first = await stage.lead.must(annotations.make, { ...pin(), key });
    const second = await other.must(annotations.make, { ...pin(), key });
    expect(second.id).not.toBe(first.id);
    expect(second.by.id).toBe(other.id);
  });

  test('gives nothing to whoever is no member any more', async () => {
    const gone = await addMember(stage.lead, stage.projectId, 'contributor');
    const key = randomUUID();
    await gone.must(annotations.make, { ...pin(), key });
    await stage.lead.must(projects.removeMember, of({ personId: gone.id }));
    expect((await gone.ask(annotations.make, { ...pin(), key })).status).toBe(404);
  });

  test('must be a UUID', async () => {
    for (const key of ['1', 'x'.repeat(300), `${randomUUID()}' --`]) {
      const answer = await stage.lead.ask(annotations.make, { ...pin(), key });
      expect([answer.status, answer.body.code]).toEqual([400, 'bad-key']);
    }
  });
});

describe('the client key of a message', () => {
  const post = (clientKey: string, text: string, residueIndex = 60) =>
    stage.lead.ask(threads.post, {
      ...of(),
      body: { clientKey, subject: { ...subject(), residueIndex }, text },
    });

  test('alone makes it one message, and names one message only', async () => {
    const clientKey = randomUUID();
    const before = await count('message');
    const [first, ...others] = await Promise.all([1, 2, 3, 4].map(() => post(clientKey, 'Once.')));
    expect(others.map(({ body }) => body.message.id)).toEqual(others.map(() => first?.body.message.id));
    expect(await count('message')).toBe(before + 1);
    expect((await post(clientKey, 'Another text.')).body.code).toBe('key-reused');
    expect((await post(clientKey, 'Once.', 61)).body.code).toBe('key-reused');
    expect(await count('message')).toBe(before + 1);
  });

  test('an id in capitals is the same id: one thread a residue', async () => {
    const { proteinId, residueIndex } = { ...subject(), residueIndex: 12 };
    const bodies = [proteinId, proteinId.toUpperCase()].map((id) => ({
      clientKey: randomUUID(),
      subject: { kind: 'residue' as const, proteinId: id, residueIndex },
      text: 'Here.',
    }));
    const [one, other] = await Promise.all(
      bodies.map((body) =>
        stage.lead.must(threads.post, { params: { projectId: stage.projectId.toUpperCase() }, body }),
      ),
    );
    expect(other?.thread.id).toBe(one?.thread.id);
    const subjectKey = `residue:${proteinId.toUpperCase()}:12`;
    const read = await stage.lead.must(threads.ofSubject, of({ subjectKey }));
    expect(read.messages).toHaveLength(2);
  });
});

describe('a change names the version it is based on', () => {
  const proteinNow = async () => {
    const proteinId = stage.protein('ATPE_ECOLI').id;
    return stage.lead.must(families.protein, of({ proteinId }));
  };
  const mutantNow = () => stage.lead.must(plans.mutant, of({ mutantId: full.mutant.id }));
  const cases: [Endpoint, () => Promise<{ now: { version: number }; input: object }>][] = [
    [
      projects.change,
      async () => {
        const { role: _, head: __, ...now } = await stage.lead.must(projects.read, of());
        return { now, input: { ...of(), body: { name: `Motor ${randomUUID()}`, readersMayComment: false } } };
      },
    ],
    [
      families.renameProtein,
      async () => {
        const now = await proteinNow();
        return {
          now,
          input: { ...of({ proteinId: now.id }), body: { organism: `E. coli ${randomUUID()}` } },
        };
      },
    ],
    [
      families.setOffsetNumbering,
      async () => {
        const now = await proteinNow();
        const body = { name: 'published', offset: now.version, skipZero: false, preferred: false };
        return { now, input: { ...of({ proteinId: now.id }), body } };
      },
    ],
    [
      maps.decide,
      async () => {
        const params = of({ structureId: full.structure.structureId });
        const { chains } = await stage.lead.must(structures.read, params);
        const now = chains.find((chain) => chain.chainId === full.chainId);
        if (!now) throw new Error('no chain');
        return { now, input: { ...of({ chainId: full.chainId }), body: { decision: 'confirm' } } };
      },
    ],
    [
      annotations.edit,
      async () => {
        const now = await pinAt(stage, 'ATPE_ECOLI', 60)(stage.lead);
        return { now, input: { ...of({ annotationId: now.id }), body: content } };
      },
    ],
    [
      annotations.setStatus,
      async () => {
        const now = await pinAt(stage, 'ATPE_ECOLI', 60)(stage.lead);
        return {
          now,
          input: { ...of({ annotationId: now.id }), body: { status: 'contested', reason: 'No.' } },
        };
      },
    ],
    [
      plans.design,
      async () => {
        const now = await mutantNow();
        const body = { constructId: full.construct.id, host: 'yeast' };
        return { now, input: { ...of({ mutantId: now.id }), body } };
      },
    ],
    [
      plans.choose,
      async () => {
        const now = await mutantNow();
        return { now, input: { ...of({ mutantId: now.id }), body: { designId: now.designs[0]?.id } } };
      },
    ],
  ];

  test('wherever the contract asks for it', () => {
    const versioned = server.container.routes.registered.filter(({ endpoint }) => endpoint.versioned);
    expect(cases.map(([{ name }]) => name).sort()).toEqual(
      versioned.map(({ endpoint }) => endpoint.name).sort(),
    );
  });

  const named = cases.map(([endpoint, make]) => ({ name: endpoint.name, endpoint, make }));
  const send = (endpoint: Endpoint, input: object) =>
    askAny(server.origin, stage.lead.token, endpoint, input);

  test.each(named)(
    '$name: none named 428, an old one 412 with what is there, the right one done once',
    async ({ endpoint, make }) => {
      const { now, input } = await make();
      for (const named of [undefined, 'W/"1"', '*', '"x"', '"1e3"', '']) {
        const headers = named === undefined ? {} : { 'if-match': named };
        const answer = await send(endpoint, { ...input, headers });
        expect([named, answer.status, answer.body.code]).toEqual([named, 428, 'version-needed']);
      }
      const stale = await send(endpoint, { ...input, version: now.version + 7 });
      expect([stale.status, stale.body.code, stale.body.current]).toEqual([412, 'stale-version', now]);
      // Two people at once: one is done, the other sees what the first made of it.
      const both = await Promise.all([1, 2].map(() => send(endpoint, { ...input, version: now.version })));
      both.sort((one, other) => one.status - other.status);
      expect(both.map(({ status }) => status)).toEqual([200, 412]);
      const done = both[0]?.body as unknown as { version: number };
      expect(done.version).toBe(now.version + 1);
      expect(both[1]?.body.current).toEqual(done);
    },
  );
});
