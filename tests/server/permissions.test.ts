// Who may do what, endpoint by endpoint. Source: shared rules of the product ("Rights"): reader reads and exports, and
// comments where the project lets readers comment; contributor annotates, comments, contests, plans, edits own; curator
// uploads, confirms, accepts, retires; lead members and settings; a team's lead makes projects. Everything else of a
// project answers 404 to whoever is not its member.
import { randomUUID } from 'node:crypto';
import {
  alignments,
  annotations,
  audit,
  auth,
  families,
  maps,
  plans,
  projects,
  residues,
  structures,
  teams,
  threads,
  uploads,
  type Endpoint,
} from '@/shared/contracts';
import {
  askAny,
  askerNames,
  sendForm,
  stageAskers,
  stageFull,
  stageTarget,
  type Asker,
  type AskerName,
  type Full,
} from '@/tests/support/access-stage';
import { ask, signUp } from '@/tests/support/person';
import { startTestServer, type TestServer } from '@/tests/support/server';
import { codingRecord, pinAt } from '@/tests/support/stage';

let server: TestServer;
let full: Full;
/** The outsider's project: the ids in it are real, only not of the project asked. */
let foreign: Full;
let askers: Record<AskerName, Asker>;
let target: Awaited<ReturnType<typeof stageTarget>>;

beforeAll(async () => {
  server = await startTestServer();
  const outsider = await signUp(server, 'The outsider');
  [full, foreign] = await Promise.all([stageFull(server), stageFull(server, outsider)]);
  askers = await stageAskers(full, outsider);
  target = await stageTarget(full);
});
afterAll(() => server.close());

type Answers = Record<AskerName, number | 'done'>;

const open: Answers = {
  'signed out': 'done',
  outsider: 'done',
  reader: 'done',
  contributor: 'done',
  curator: 'done',
  lead: 'done',
};
const signedIn: Answers = { ...open, 'signed out': 401 };
const anyMember: Answers = { ...signedIn, outsider: 404 };
const fromContributor: Answers = { ...anyMember, reader: 403 };
const fromCurator: Answers = { ...fromContributor, contributor: 403 };
const leadAlone: Answers = { ...fromCurator, curator: 403 };
/** A project is made by a lead of its team; whoever is not in the team does not see it. */
const teamLeadAlone: Answers = { ...signedIn, outsider: 404, reader: 404, contributor: 404, curator: 404 };

type Input = Parameters<typeof askAny>[3];
interface Row {
  endpoint: Endpoint;
  /** Where one endpoint is open to more in some circumstances. */
  when?: string;
  answers: Answers;
  /** The same for everybody who asks: makes what is acted on as it must be, and gives what is sent. */
  input?: (asker: Asker) => Promise<Input> | Input;
  /** For what is not a plain call. */
  send?: (asker: Asker) => Promise<{ status: number; body: object }>;
}

const of = <More extends object>(more = {} as More) => ({ params: { projectId: full.projectId, ...more } });
const protein = () => full.stage.protein('ATPE2_ACEWO_4BEM').id;
const residue = () => ({ proteinId: protein(), residueIndex: 61 });
const content = {
  kind: 'ion site',
  text: 'Carries the ion.',
  confidence: 'high',
  evidence: [{ kind: 'coordinates', reference: 'PDB 4BEM' }],
};
const account = () => ({
  email: `${randomUUID()}@lab.example`,
  name: 'Somebody',
  password: 'a long enough password',
});
const lead = () => full.stage.lead;

async function proteinVersion(): Promise<number> {
  const { version } = await lead().must(families.protein, of({ proteinId: protein() }));
  return version;
}

/** An annotation in the status asked for, given to whoever asks or to somebody else. */
async function annotationFor(asker: Asker, own: boolean, status = 'proposed') {
  const made = await pinAt(full.stage, 'ATPE2_ACEWO_4BEM', 61)(lead());
  let { version } = made;
  if (status !== 'proposed') {
    const body = { status: status as 'retired', reason: 'For the test.' };
    ({ version } = await lead().must(annotations.setStatus, {
      ...of({ annotationId: made.id }),
      version,
      body,
    }));
  }
  const by = own && asker.person ? asker.person.id : target.personId;
  await server.container.source.query('UPDATE annotation SET created_by = ? WHERE id = ?', [by, made.id]);
  return { ...of({ annotationId: made.id }), version };
}

const statusRow = (status: string, from: string, own: boolean, answers: Answers): Row => ({
  endpoint: annotations.setStatus,
  when: `${status}, ${own ? 'one’s own' : 'another’s'}`,
  answers,
  input: async (asker) => ({
    ...(await annotationFor(asker, own, from)),
    body: { status, reason: 'It is so.' },
  }),
});

const message = () => ({
  clientKey: randomUUID(),
  subject: { kind: 'residue', ...residue() },
  text: 'What of this one?',
});
const readersMayComment = (may: boolean) =>
  server.container.source.query('UPDATE project SET readers_may_comment = ? WHERE id = ?', [
    may,
    full.projectId,
  ]);

const rows: Row[] = [
  { endpoint: auth.signUp, answers: open, input: () => ({ body: account() }) },
  {
    endpoint: auth.signIn,
    answers: open,
    input: async () => {
      const body = account();
      await ask(server.origin, null, auth.signUp, { body });
      return { body: { email: body.email, password: body.password } };
    },
  },
  {
    endpoint: auth.renew,
    answers: open,
    input: async () => {
      const { headers } = await ask(server.origin, null, auth.signUp, { body: account() });
      return { headers: { cookie: /^[^;]+/.exec(headers.get('set-cookie') ?? '')?.[0] ?? '' } };
    },
  },
  { endpoint: auth.signOut, answers: open },
  { endpoint: auth.me, answers: signedIn },

  { endpoint: teams.list, answers: signedIn },
  { endpoint: teams.make, answers: signedIn, input: () => ({ body: { name: 'Another team' } }) },

  { endpoint: projects.list, answers: signedIn },
  {
    endpoint: projects.make,
    answers: teamLeadAlone,
    input: () => ({ body: { teamId: full.stage.project.teamId, name: 'Another motor', motorKind: 'F' } }),
  },
  { endpoint: projects.read, answers: anyMember, input: () => of() },
  {
    endpoint: projects.change,
    answers: leadAlone,
    input: async () => {
      const { version } = await lead().must(projects.read, of());
      return { ...of(), version, body: { name: `Motor ${randomUUID()}`, readersMayComment: false } };
    },
  },
  { endpoint: projects.members, answers: anyMember, input: () => of() },
  {
    endpoint: projects.addMember,
    answers: leadAlone,
    input: async () => {
      await target.isMember(false);
      return { ...of(), body: { email: target.email, role: 'reader' } };
    },
  },
  {
    endpoint: projects.changeMember,
    answers: leadAlone,
    input: async () => {
      await target.isMember(true);
      return { ...of({ personId: target.personId }), body: { role: 'contributor' } };
    },
  },
  {
    endpoint: projects.removeMember,
    answers: leadAlone,
    input: async () => {
      await target.isMember(true);
      return of({ personId: target.personId });
    },
  },
  { endpoint: projects.events, answers: anyMember, input: () => ({ ...of(), query: { after: 0 } }) },

  { endpoint: families.list, answers: anyMember, input: () => of() },
  {
    endpoint: families.make,
    answers: fromCurator,
    input: () => ({
      ...of(),
      body: { name: `x${randomUUID().slice(0, 6)}`, aliases: [], part: 'other', catalytic: false },
    }),
  },
  { endpoint: families.proteins, answers: anyMember, input: () => of({ familyId: full.stage.familyId }) },
  { endpoint: families.protein, answers: anyMember, input: () => of({ proteinId: protein() }) },
  {
    endpoint: families.renameProtein,
    answers: fromCurator,
    input: async () => ({
      ...of({ proteinId: protein() }),
      version: await proteinVersion(),
      body: { organism: `Acetobacterium ${randomUUID()}` },
    }),
  },
  {
    endpoint: families.setOffsetNumbering,
    answers: fromCurator,
    input: async () => ({
      ...of({ proteinId: protein() }),
      version: await proteinVersion(),
      body: { name: 'as published', offset: 3, skipZero: false, preferred: false },
    }),
  },

  { endpoint: uploads.list, answers: anyMember, input: () => of() },
  {
    endpoint: uploads.make,
    answers: fromCurator,
    send: ({ token }) => sendForm(server.origin, full.projectId, token, full.stage.familyId),
  },
  {
    endpoint: uploads.read,
    answers: anyMember,
    input: () => of({ uploadId: full.stage.alignmentUpload.id }),
  },
  {
    endpoint: uploads.excerpt,
    answers: anyMember,
    input: () => ({ ...of({ uploadId: full.stage.alignmentUpload.id }), query: { line: 1 } }),
  },

  { endpoint: alignments.list, answers: anyMember, input: () => of() },
  { endpoint: alignments.read, answers: anyMember, input: () => of({ alignmentId: full.stage.alignmentId }) },
  { endpoint: structures.list, answers: anyMember, input: () => of() },
  {
    endpoint: structures.read,
    answers: anyMember,
    input: () => of({ structureId: full.structure.structureId }),
  },
  {
    endpoint: maps.decide,
    answers: fromCurator,
    input: async () => {
      const { chains } = await lead().must(structures.read, of({ structureId: full.structure.structureId }));
      const version = chains.find((chain) => chain.chainId === full.chainId)?.version;
      return { ...of({ chainId: full.chainId }), version, body: { decision: 'confirm' } };
    },
  },
  {
    endpoint: maps.confirmReady,
    answers: fromCurator,
    input: () => of({ structureId: full.structure.structureId }),
  },

  { endpoint: residues.locate, answers: anyMember, input: () => ({ ...of(), query: { text: 'cE62' } }) },
  { endpoint: residues.passport, answers: anyMember, input: () => of(residue()) },

  { endpoint: annotations.list, answers: anyMember, input: () => of() },
  { endpoint: annotations.atResidue, answers: anyMember, input: () => of(residue()) },
  {
    endpoint: annotations.make,
    answers: fromContributor,
    input: () => ({ ...of(), body: { pins: [residue()], ...content } }),
  },
  {
    endpoint: annotations.edit,
    when: 'one’s own',
    answers: fromContributor,
    input: async (asker) => ({ ...(await annotationFor(asker, true)), body: content }),
  },
  {
    endpoint: annotations.edit,
    when: 'another’s',
    answers: fromCurator,
    input: async (asker) => ({ ...(await annotationFor(asker, false)), body: content }),
  },
  statusRow('contested', 'proposed', true, fromContributor),
  statusRow('contested', 'accepted', false, fromContributor),
  statusRow('accepted', 'proposed', true, fromCurator),
  statusRow('accepted', 'contested', false, fromCurator),
  statusRow('retired', 'proposed', true, fromContributor),
  statusRow('retired', 'accepted', false, fromCurator),
  statusRow('proposed', 'retired', true, fromContributor),
  statusRow('proposed', 'contested', false, fromCurator),
  {
    endpoint: annotations.versions,
    answers: anyMember,
    input: () => of({ annotationId: full.annotation.id }),
  },

  { endpoint: threads.list, answers: anyMember, input: () => of() },
  {
    endpoint: threads.ofSubject,
    answers: anyMember,
    input: () => of({ subjectKey: `residue:${protein()}:61` }),
  },
  {
    endpoint: threads.post,
    answers: fromContributor,
    input: async () => {
      await readersMayComment(false);
      return { ...of(), body: message() };
    },
  },
  {
    endpoint: threads.post,
    when: 'where readers may comment',
    answers: anyMember,
    input: async () => {
      await readersMayComment(true);
      return { ...of(), body: message() };
    },
  },

  { endpoint: plans.constructs, answers: anyMember, input: () => of() },
  {
    endpoint: plans.makeConstruct,
    answers: fromContributor,
    input: () => ({ ...of(), body: newConstruct() }),
  },
  { endpoint: plans.mutants, answers: anyMember, input: () => of() },
  { endpoint: plans.mutant, answers: anyMember, input: () => of({ mutantId: full.mutant.id }) },
  { endpoint: plans.makeMutant, answers: fromContributor, input: () => ({ ...of(), body: newMutant() }) },
  {
    endpoint: plans.design,
    answers: fromContributor,
    input: async () => ({ ...(await mutantNow()), body: { constructId: full.construct.id, host: 'ecoli' } }),
  },
  {
    endpoint: plans.choose,
    answers: fromContributor,
    input: async () => {
      const { designId, ...rest } = await mutantNow();
      return { ...rest, body: { designId } };
    },
  },
  { endpoint: plans.primerList, answers: anyMember, input: () => of() },
  { endpoint: audit.list, answers: anyMember, input: () => of() },
];

function newConstruct() {
  const proteinId = full.stage.protein('ATPE_VIBCH').id;
  const dna = codingRecord('VIBCH_atpE');
  return { name: 'pAnother', dna, codingStart: 1, circular: false, geneticCode: 11, proteinId };
}

function newMutant() {
  const proteinId = full.stage.protein('ATPE_VIBCH').id;
  return { proteinId, changes: 'D60N', constructId: full.construct.id, reason: 'To see.' };
}

async function mutantNow() {
  const { version, designs } = await lead().must(plans.mutant, of({ mutantId: full.mutant.id }));
  return { ...of({ mutantId: full.mutant.id }), version, designId: designs[0]?.id };
}

const nameOf = ({ endpoint, when }: Row) => (when ? `${endpoint.name}, ${when}` : endpoint.name);

test('every endpoint of the server is in the table', () => {
  const registered = server.container.routes.registered.map(({ endpoint }) => endpoint.name);
  const inTable = [...new Set(rows.map(({ endpoint }) => endpoint.name))];
  expect(inTable.sort()).toEqual([...registered].sort());
});

/** Rows of every table that one asked act could have written. */
async function written(): Promise<string> {
  const [counts] = await server.container.source.query(
    `SELECT (SELECT SUM(event_number) FROM stream_head) events, (SELECT COUNT(*) FROM audit_entry) audits,
            (SELECT COUNT(*) FROM upload) uploads, (SELECT COUNT(*) FROM job) jobs,
            (SELECT COUNT(*) FROM project_member) members, (SELECT COUNT(*) FROM message) messages`,
  );
  return JSON.stringify(counts);
}

describe.each(rows.map((row) => [nameOf(row), row] as const))('%s', (_, row) => {
  test.each(askerNames.map((name) => [name, row.answers[name]] as const))(
    '%s: %s',
    async (name, expected) => {
      const asker = askers[name];
      const input = (await row.input?.(asker)) ?? {};
      const before = await written();
      const answer = row.send
        ? await row.send(asker)
        : await askAny(server.origin, asker.token, row.endpoint, input);
      if (expected === 'done') {
        expect([answer.status, answer.body]).toEqual([row.endpoint.status, answer.body]);
        // Its file is read before the next one asks, who may have nothing written.
        if (row.send) await lead().settled(full.projectId, (answer.body as { id: string }).id);
      } else {
        expect([answer.status, answer.body]).toEqual([
          expected,
          expect.objectContaining({ status: expected }),
        ]);
        expect(await written()).toBe(before);
      }
    },
  );
});

test('a member of the team who does not lead it sees it and may not make projects', async () => {
  const member = await signUp(server, 'Of the team');
  await server.container.source.query(
    'INSERT INTO team_member (team_id, person_id, is_lead, created_at, created_by) VALUES (?, ?, 0, NOW(3), ?)',
    [full.stage.project.teamId, member.id, lead().id],
  );
  const body = { teamId: full.stage.project.teamId, name: 'Another motor', motorKind: 'F' as const };
  expect((await member.ask(projects.make, { body })).status).toBe(403);
  expect(await member.must(teams.list)).toEqual([
    expect.objectContaining({ id: body.teamId, isLead: false }),
  ]);
  expect(await member.must(projects.list)).toEqual([]);
});

test('a team lead without a membership of the project does not see it', async () => {
  const { origin } = server;
  const teamLead = lead();
  const second = await signUp(server, 'The second lead');
  const made = await teamLead.must(projects.make, {
    body: { teamId: full.stage.project.teamId, name: 'Handed over', motorKind: 'F' },
  });
  const params = { projectId: made.id };
  await teamLead.must(projects.addMember, { params, body: { email: second.email, role: 'lead' } });
  await second.must(projects.removeMember, { params: { ...params, personId: teamLead.id } });
  expect((await ask(origin, teamLead.token, projects.read, { params })).status).toBe(404);
  const theirs = await teamLead.must(projects.list);
  expect(theirs.map(({ id }) => id)).not.toContain(made.id);
});

describe('ids of another project inside one’s own project answer as if they were not there', () => {
  const pinOn = (ref: object) => ({ ...of(), body: { pins: [ref], ...content } });
  const subjects = (): [string, object, string][] => {
    const proteinId = foreign.stage.protein('ATPE_ECOLI').id;
    return [
      ['residue', { kind: 'residue', proteinId, residueIndex: 60 }, `residue:${proteinId}:60`],
      [
        'annotation',
        { kind: 'annotation', id: foreign.annotation.id },
        `annotation:${foreign.annotation.id}`,
      ],
      ['mutant', { kind: 'mutant', id: foreign.mutant.id }, `mutant:${foreign.mutant.id}`],
      [
        'structure',
        { kind: 'structure', id: foreign.structure.structureId },
        `structure:${foreign.structure.structureId}`,
      ],
    ];
  };
  const theirProtein = () => foreign.stage.protein('ATPE2_ACEWO_4BEM').id;
  const chainVersion = async () => {
    const { chains } = await lead().must(structures.read, of({ structureId: full.structure.structureId }));
    return chains.find((chain) => chain.chainId === full.chainId)?.version;
  };

  const cases: [string, Endpoint, () => Promise<Input> | Input][] = [
    [
      'changes a person who is no member',
      projects.changeMember,
      () => ({ ...of({ personId: foreign.stage.lead.id }), body: { role: 'lead' } }),
    ],
    [
      'removes a person who is no member',
      projects.removeMember,
      () => of({ personId: foreign.stage.lead.id }),
    ],
    ['a family', families.proteins, () => of({ familyId: foreign.stage.familyId })],
    ['a protein', families.protein, () => of({ proteinId: theirProtein() })],
    [
      'a protein to rename',
      families.renameProtein,
      () => ({ ...of({ proteinId: theirProtein() }), version: 1, body: { organism: 'Taken' } }),
    ],
    [
      'a protein to number',
      families.setOffsetNumbering,
      () => ({
        ...of({ proteinId: theirProtein() }),
        version: 1,
        body: { name: 'x', offset: 1, skipZero: false, preferred: true },
      }),
    ],
    ['an upload', uploads.read, () => of({ uploadId: foreign.stage.alignmentUpload.id })],
    [
      'an upload’s lines',
      uploads.excerpt,
      () => ({ ...of({ uploadId: foreign.stage.alignmentUpload.id }), query: { line: 1 } }),
    ],
    ['an alignment', alignments.read, () => of({ alignmentId: foreign.stage.alignmentId })],
    ['a structure', structures.read, () => of({ structureId: foreign.structure.structureId })],
    ['a structure to confirm', maps.confirmReady, () => of({ structureId: foreign.structure.structureId })],
    [
      'a chain',
      maps.decide,
      () => ({ ...of({ chainId: foreign.chainId }), version: 1, body: { decision: 'confirm' } }),
    ],
    [
      'a protein to lay a chain on',
      maps.decide,
      async () => ({
        ...of({ chainId: full.chainId }),
        version: await chainVersion(),
        body: { decision: 'correct', proteinId: theirProtein() },
      }),
    ],
    [
      'a family to add a chain to',
      maps.decide,
      async () => ({
        ...of({ chainId: full.chainId }),
        version: await chainVersion(),
        body: { decision: 'add protein', familyId: foreign.stage.familyId, organism: 'x' },
      }),
    ],
    ['a residue', residues.passport, () => of({ proteinId: theirProtein(), residueIndex: 61 })],
    [
      'a residue’s annotations',
      annotations.atResidue,
      () => of({ proteinId: theirProtein(), residueIndex: 61 }),
    ],
    ['a residue to pin', annotations.make, () => pinOn({ proteinId: theirProtein(), residueIndex: 61 })],
    [
      'a structure a pin speaks of',
      annotations.make,
      () => pinOn({ ...residue(), structureId: foreign.structure.structureId }),
    ],
    [
      'an annotation to edit',
      annotations.edit,
      () => ({ ...of({ annotationId: foreign.annotation.id }), version: 1, body: content }),
    ],
    [
      'an annotation to accept',
      annotations.setStatus,
      () => ({
        ...of({ annotationId: foreign.annotation.id }),
        version: 1,
        body: { status: 'accepted', reason: '' },
      }),
    ],
    ['an annotation’s versions', annotations.versions, () => of({ annotationId: foreign.annotation.id })],
    [
      'a protein a construct encodes',
      plans.makeConstruct,
      () => ({ ...of(), body: { ...newConstruct(), proteinId: foreign.stage.protein('ATPE_VIBCH').id } }),
    ],
    [
      'a protein to change',
      plans.makeMutant,
      () => ({ ...of(), body: { ...newMutant(), proteinId: foreign.stage.protein('ATPE_VIBCH').id } }),
    ],
    [
      'a construct to plan in',
      plans.makeMutant,
      () => ({ ...of(), body: { ...newMutant(), constructId: foreign.construct.id } }),
    ],
    ['a mutant', plans.mutant, () => of({ mutantId: foreign.mutant.id })],
    [
      'a mutant to design',
      plans.design,
      () => ({
        ...of({ mutantId: foreign.mutant.id }),
        version: foreign.mutant.version,
        body: { constructId: full.construct.id, host: 'ecoli' },
      }),
    ],
    [
      'a construct to design in',
      plans.design,
      async () => ({ ...(await mutantNow()), body: { constructId: foreign.construct.id, host: 'ecoli' } }),
    ],
    [
      'a mutant to choose for',
      plans.choose,
      () => ({
        ...of({ mutantId: foreign.mutant.id }),
        version: foreign.mutant.version,
        body: { designId: foreign.mutant.designs[0]?.id },
      }),
    ],
    [
      'a design to choose',
      plans.choose,
      async () => ({ ...(await mutantNow()), body: { designId: foreign.mutant.designs[0]?.id } }),
    ],
    ['nothing, but a subject', threads.ofSubject, () => of({ subjectKey: subjects()[0]?.[2] })],
  ];

  test('every endpoint that takes an id of something within a project is among them', () => {
    const taking = server.container.routes.registered
      .map(({ endpoint }) => endpoint)
      .filter(({ path }) => /:projectId\/.*:/.test(path));
    const held = new Set(cases.map(([, endpoint]) => endpoint.name));
    expect(taking.map(({ name }) => name).filter((name) => !held.has(name))).toEqual([]);
  });

  test.each(cases.map(([what, endpoint, input]) => ({ what, endpoint, input, name: endpoint.name })))(
    '$what ($name)',
    async ({ endpoint, input }) => {
      const sent = await input();
      const before = await written();
      const answer = await askAny(server.origin, lead().token, endpoint, sent);
      expect([answer.status, answer.body.code]).toEqual([404, 'not-found']);
      expect(await written()).toBe(before);
    },
  );

  test.each(['residue', 'annotation', 'mutant', 'structure'])(
    'a thread on a foreign %s is not read and not written',
    async (kind) => {
      const [, subject, subjectKey] = subjects().find(([one]) => one === kind) ?? ['', {}, ''];
      const before = await written();
      const read = await askAny(server.origin, lead().token, threads.ofSubject, of({ subjectKey }));
      const body = { clientKey: randomUUID(), subject, text: 'Hello?' };
      const post = await askAny(server.origin, lead().token, threads.post, { ...of(), body });
      expect([read.status, post.status]).toEqual([404, 404]);
      expect(await written()).toBe(before);
    },
  );

  test('a family to upload to', async () => {
    const { token } = lead();
    const answer = await sendForm(server.origin, full.projectId, token, foreign.stage.familyId);
    expect(answer.status).toBe(404);
  });

  test('filters show nothing of it', async () => {
    const proteinId = foreign.stage.protein('ATPE_VIBCH').id;
    expect(await lead().must(plans.mutants, { ...of(), query: { proteinId } })).toEqual([]);
    const query = { subjectKind: 'mutant', subjectId: foreign.mutant.id };
    expect(await lead().must(audit.list, { ...of(), query })).toEqual({ entries: [], next: null });
    const before = 'ffffffff-ffff-7fff-bfff-ffffffffffff';
    const list = await lead().must(annotations.list, { ...of(), query: { before, limit: 100 } });
    expect(list.annotations.map(({ id }) => id)).not.toContain(foreign.annotation.id);
    expect(list.annotations.map(({ id }) => id)).toContain(full.annotation.id);
  });
});

test('ids that cannot be ids lead nowhere', async () => {
  for (const projectId of ['1', '..', '%00', "' OR 1=1", 'x'.repeat(5000)]) {
    const answer = await ask(server.origin, lead().token, projects.read, { params: { projectId } });
    expect([answer.status, answer.body.code]).toEqual([404, 'not-found']);
  }
});
