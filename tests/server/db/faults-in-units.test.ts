// A unit of work that fails at any of its statements is run again whole, or fails cleanly: never half, nothing twice.
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
import type { AnnouncedEvent } from '@/server/db';
import { askAny, stageFull, type Full } from '@/tests/support/access-stage';
import { DatabaseFaults, type Fault } from '@/tests/support/database-faults';
import { signUp } from '@/tests/support/person';
import { startTestServer, type TestServer } from '@/tests/support/server';
import { codingRecord, pinAt } from '@/tests/support/stage';

let server: TestServer;
let full: Full;
let faults: DatabaseFaults;
let tables: string[];
let published: AnnouncedEvent[];

beforeAll(async () => {
  server = await startTestServer();
  full = await stageFull(server);
  const { container } = server;
  container.unitOfWork.onCommitted((events) => {
    published.push(...events);
    container.live.publish(events);
  });
  const rows: Record<string, string>[] = await container.source.query('SHOW TABLES');
  tables = rows.flatMap((row) => Object.values(row)).filter((name) => name !== 'migrations');
  faults = new DatabaseFaults(container.source);
});
beforeEach(() => {
  published = [];
});
afterAll(async () => {
  faults.restore();
  await server.close();
});

type Counts = Record<string, number>;

/** Rows in each table, and how far the project's events are. */
async function counts(): Promise<Counts> {
  const columns = tables.map((name) => `(SELECT COUNT(*) FROM \`${name}\`) AS \`${name}\``);
  const [row] = await server.container.source.query(
    `SELECT ${columns.join(', ')}, (SELECT SUM(event_number) FROM stream_head) AS head`,
  );
  return Object.fromEntries(Object.entries(row as object).map(([name, count]) => [name, Number(count)]));
}

const difference = (before: Counts, after: Counts): Counts =>
  Object.fromEntries(
    Object.keys(after).flatMap((name) => {
      const by = (after[name] ?? 0) - (before[name] ?? 0);
      return by === 0 ? [] : [[name, by]];
    }),
  );

const of = <More extends object>(more = {} as More) => ({ params: { projectId: full.projectId, ...more } });
const lead = () => full.stage.lead;
const content = {
  kind: 'ion site',
  text: 'Carries the ion.',
  confidence: 'high',
  evidence: [{ kind: 'coordinates', reference: 'PDB 4BEM' }],
};

/** Each gives an act that can be done again and again, with the same traces each time. */
const acts: { endpoint: Endpoint; input: () => Promise<object> | object }[] = [
  { endpoint: teams.make, input: () => ({ body: { name: 'A team' } }) },
  {
    endpoint: projects.make,
    input: () => ({ body: { teamId: full.stage.project.teamId, name: 'A motor', motorKind: 'F' } }),
  },
  {
    endpoint: projects.change,
    input: async () => {
      const { version } = await lead().must(projects.read, of());
      return { ...of(), version, body: { name: `Motor ${randomUUID()}`, readersMayComment: false } };
    },
  },
  {
    endpoint: projects.addMember,
    input: async () => ({ ...of(), body: { email: (await signUp(server)).email, role: 'reader' } }),
  },
  {
    endpoint: families.setOffsetNumbering,
    input: async () => {
      const proteinId = full.stage.protein('ATPE_ECOLI').id;
      const { version } = await lead().must(families.protein, of({ proteinId }));
      const body = {
        name: `as in ${randomUUID().slice(0, 8)}`,
        offset: 3,
        skipZero: false,
        preferred: false,
      };
      return { ...of({ proteinId }), version, body };
    },
  },
  {
    endpoint: maps.decide,
    input: async () => {
      const params = of({ structureId: full.structure.structureId });
      const { chains } = await lead().must(structures.read, params);
      const version = chains.find((chain) => chain.chainId === full.chainId)?.version;
      return { ...of({ chainId: full.chainId }), version, body: { decision: 'confirm' } };
    },
  },
  {
    endpoint: annotations.make,
    input: () => {
      const pins = [{ proteinId: full.stage.protein('ATPE_ECOLI').id, residueIndex: 60 }];
      return { ...of(), body: { pins, ...content } };
    },
  },
  {
    endpoint: annotations.edit,
    input: async () => {
      const { id, version } = await pinAt(full.stage, 'ATPE_ECOLI', 60)(lead());
      return { ...of({ annotationId: id }), version, body: content };
    },
  },
  {
    endpoint: threads.post,
    input: () => {
      const subject = { kind: 'mutant', id: full.mutant.id };
      return { ...of(), body: { clientKey: randomUUID(), subject, text: 'Shall we order it?' } };
    },
  },
  {
    endpoint: plans.makeConstruct,
    input: () => {
      const proteinId = full.stage.protein('ATPE_VIBCH').id;
      const dna = codingRecord('VIBCH_atpE');
      const body = { name: 'pVc', dna, codingStart: 1, circular: false, geneticCode: 11, proteinId };
      return { ...of(), body };
    },
  },
  {
    endpoint: plans.design,
    input: async () => {
      const { version } = await lead().must(plans.mutant, of({ mutantId: full.mutant.id }));
      return {
        ...of({ mutantId: full.mutant.id }),
        version,
        body: { constructId: full.construct.id, host: 'ecoli' },
      };
    },
  },
];

const isFull = process.env.FAULTS === 'full';
const kinds = ['deadlock', 'lock wait', 'row changed', 'lost before'] as const;

interface Outcome {
  status: number;
  done: Counts;
  published: string[];
}

async function run(
  { endpoint, input }: (typeof acts)[number],
  at: number | 'COMMIT',
  fault: Fault | null,
  key?: string,
) {
  const sent = await input();
  const before = await counts();
  published = [];
  faults.arm(at, fault);
  const answer = await askAny(server.origin, lead().token, endpoint, { ...sent, ...(key && { key }) });
  const statements = [...faults.statements];
  const { struck } = faults;
  faults.arm(0, null);
  const outcome: Outcome = {
    status: answer.status,
    done: difference(before, await counts()),
    published: published.map((event) => event.kind),
  };
  return { outcome, statements, struck, answer };
}

describe.each(acts.map((act) => [act.endpoint.name, act] as const))('%s', (_, act) => {
  let clean: Outcome;
  let statements: string[];
  beforeAll(async () => {
    // The first time makes what stays, a thread's row for one.
    await run(act, 0, null, randomUUID());
    ({ outcome: clean, statements } = await run(act, 0, null, randomUUID()));
  });
  /** The first, the last, and those between at even steps; each of them with FAULTS=full. */
  const places = (): number[] => {
    expect(clean.status).toBe(act.endpoint.status);
    expect(statements.at(-1)).toBe('COMMIT');
    const step = isFull ? 1 : Math.ceil(statements.length / 5);
    const all = statements.map((_, at) => at + 1);
    return all.filter((at) => at % step === 1 % step || at === statements.length);
  };

  test.each(act.endpoint === threads.post || isFull ? kinds : (['deadlock', 'lost before'] as const))(
    '%s at any statement: done again whole, once',
    async (fault) => {
      for (const at of places()) {
        const { outcome, struck } = await run(act, at, fault, randomUUID());
        const where = { at, sql: statements[at - 1] };
        expect({ ...where, struck, ...outcome }).toEqual({ ...where, struck: true, ...clean });
      }
    },
  );

  test('the answer to the commit lost: under a key the same is answered, and done once', async () => {
    const { outcome, answer } = await run(act, 'COMMIT', 'lost after', randomUUID());
    expect(outcome).toEqual({ ...clean, published: outcome.published });
    expect(act.endpoint.reply.safeParse(answer.body).success).toBe(true);
  });

  test('without a key: done again when lost before the commit, else refused for a moment with all or nothing written', async () => {
    const { client_request: _, ...withoutKey } = clean.done;
    const early = await run(act, 2, 'lost before');
    expect([early.struck, early.outcome]).toEqual([true, { ...clean, done: withoutKey }]);
    const lost = await run(act, 'COMMIT', 'lost before');
    expect(lost.outcome).toEqual({ status: 503, done: {}, published: [] });
    expect(Number(lost.answer.headers.get('retry-after'))).toBeGreaterThan(0);
    const unheard = await run(act, 'COMMIT', 'lost after');
    expect(unheard.outcome).toEqual({ status: 503, done: withoutKey, published: [] });
  });
});
