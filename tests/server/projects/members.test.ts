import { audit, families, projects, teams } from '@/shared/contracts';
import { addMember, makeProject, signUp, type TestPerson } from '@/tests/support/person';
import { startTestServer, type TestServer } from '@/tests/support/server';

let server: TestServer;
let lead: TestPerson;
let projectId: string;
beforeAll(async () => {
  server = await startTestServer();
});
beforeEach(async () => {
  lead = await signUp(server, 'The lead');
  projectId = (await makeProject(lead)).id;
});
afterAll(() => server.close());

const of = <More extends object>(more = {} as More) => ({ params: { projectId, ...more } });
const add = (email: string, role: 'reader' | 'lead' = 'reader') =>
  lead.ask(projects.addMember, { ...of(), body: { email, role } });

test('a project is made with the families of an F-type motor, each with its part', async () => {
  const list = await lead.must(families.list, of());
  expect(Object.fromEntries(list.map(({ name, part }) => [name, part]))).toMatchObject({
    a: 'stator',
    c: 'rotor',
    α: 'head',
    β: 'head',
    γ: 'rotor',
    ε: 'rotor',
    b: 'stalk',
    δ: 'stalk',
  });
  expect(await lead.must(projects.members, of())).toEqual([
    expect.objectContaining({ personId: lead.id, role: 'lead', email: lead.email }),
  ]);
});

test('a lead adds somebody who has an account, by address in any case, once', async () => {
  const person = await signUp(server, 'Ines Holm');
  const { status, body } = await add(`  ${person.email.toUpperCase()} `.trim());
  expect([status, body.personId, body.name, body.role]).toEqual([201, person.id, 'Ines Holm', 'reader']);
  const again = await add(person.email);
  expect([again.status, again.body.code]).toEqual([409, 'already-member']);
  const nobody = await add('nobody@lab.example');
  expect([nobody.status, nobody.body.code, nobody.body.fields?.[0]?.path]).toEqual([
    422,
    'no-account',
    'email',
  ]);
  expect(await person.must(projects.list)).toEqual([
    expect.objectContaining({ id: projectId, role: 'reader' }),
  ]);
});

test('the last lead cannot go and cannot step down; with a second one, one can', async () => {
  const self = of({ personId: lead.id });
  const refused = [
    await lead.ask(projects.removeMember, self),
    await lead.ask(projects.changeMember, { ...self, body: { role: 'curator' } }),
  ];
  expect(refused.map(({ status, body }) => [status, body.code])).toEqual([
    [409, 'last-lead'],
    [409, 'last-lead'],
  ]);
  await lead.must(projects.changeMember, { ...self, body: { role: 'lead' } });
  const second = await addMember(lead, projectId, 'lead');
  await lead.must(projects.removeMember, self);
  expect((await lead.ask(projects.read, of())).status).toBe(404);
  expect((await second.must(projects.members, of())).map(({ personId }) => personId)).toEqual([second.id]);
});

test('of two leads who put each other out at once, one stays', async () => {
  const second = await addMember(lead, projectId, 'lead');
  const answers = await Promise.all([
    lead.ask(projects.removeMember, of({ personId: second.id })),
    second.ask(projects.removeMember, of({ personId: lead.id })),
  ]);
  expect(answers.filter(({ status }) => status === 200)).toHaveLength(1);
  const rows: unknown[] = await server.container.source.query(
    "SELECT person_id FROM project_member WHERE project_id = ? AND role = 'lead'",
    [projectId],
  );
  expect(rows).toHaveLength(1);
});

test('a lowered role acts at once', async () => {
  const member = await addMember(lead, projectId, 'lead');
  await lead.must(projects.changeMember, { ...of({ personId: member.id }), body: { role: 'reader' } });
  const { version } = await member.must(projects.read, of());
  const answer = await member.ask(projects.change, {
    ...of(),
    version,
    body: { name: 'Mine', readersMayComment: true },
  });
  expect([answer.status, answer.body.code]).toEqual([403, 'not-allowed']);
  expect(answer.body.detail).toBe(
    'As reader of this project you may not do this (change settings). Ask a lead of the project.',
  );
});

test('the record holds who did what to whom, with what was before', async () => {
  const member = await addMember(lead, projectId, 'reader');
  const personId = member.id;
  await lead.must(projects.changeMember, { ...of({ personId }), body: { role: 'curator' } });
  const { version } = await lead.must(projects.read, of());
  await lead.must(projects.change, { ...of(), version, body: { name: 'Renamed', readersMayComment: true } });
  await lead.must(projects.removeMember, of({ personId }));
  const { entries, next } = await lead.must(audit.list, of());
  expect(next).toBeNull();
  expect(
    entries.map(({ action, subjectId, by, before, after }) => ({
      action,
      subjectId,
      by: by.id,
      before,
      after,
    })),
  ).toEqual([
    { action: 'member.removed', subjectId: personId, by: lead.id, before: { role: 'curator' }, after: null },
    {
      action: 'project.changed',
      subjectId: projectId,
      by: lead.id,
      before: { name: 'A motor', readersMayComment: false },
      after: { name: 'Renamed', readersMayComment: true },
    },
    {
      action: 'member.changed',
      subjectId: personId,
      by: lead.id,
      before: { role: 'reader' },
      after: { role: 'curator' },
    },
    { action: 'member.added', subjectId: personId, by: lead.id, before: null, after: { role: 'reader' } },
    expect.objectContaining({ action: 'project.made', subjectId: projectId }),
  ]);
});

test('the record is read in pages, each entry once, and of one subject alone', async () => {
  const members = [];
  for (let at = 0; at < 5; at += 1) members.push(await addMember(lead, projectId, 'reader'));
  const seen: string[] = [];
  let before: number | undefined;
  do {
    const page = await lead.must(audit.list, { ...of(), query: { limit: 2, ...(before && { before }) } });
    seen.push(...page.entries.map(({ id }) => id));
    before = page.next ?? undefined;
  } while (before);
  expect(seen).toHaveLength(6);
  expect(new Set(seen).size).toBe(6);
  const query = { subjectKind: 'person', subjectId: members[2]?.id ?? '' };
  const { entries } = await lead.must(audit.list, { ...of(), query });
  expect(entries.map(({ action }) => action)).toEqual(['member.added']);
  for (const limit of [0, 101, -1]) {
    expect((await lead.ask(audit.list, { ...of(), query: { limit } })).status).toBe(400);
  }
});

test.each([
  ['a name of 10,000 characters', { name: 'x'.repeat(10_000) }, 'name'],
  ['an empty name', { name: '  ' }, 'name'],
  ['a name of two lines', { name: 'one\u2028two' }, 'name'],
  ['a motor that is none', { motorKind: 'Z' }, 'motorKind'],
])('%s is refused at its field', async (_, change, path) => {
  const [team] = await lead.must(teams.list);
  const body = { teamId: team?.id ?? '', name: 'A motor', motorKind: 'F' as const, ...change };
  const { status, body: said } = await lead.ask(projects.make, { body: body as never });
  expect([status, said.fields?.map((field) => field.path)]).toEqual([400, [path]]);
});

test('names with markup, and in every script, stay the text they are', async () => {
  for (const name of [
    '<script>alert(1)</script>',
    'F₁Fₒ «βγ» 回転 🧬',
    "Robert'); DROP TABLE project; --",
    '%_\\',
  ]) {
    const made = await makeProject(lead, name);
    expect((await lead.must(projects.read, { params: { projectId: made.id } })).name).toBe(name);
    expect((await lead.must(teams.make, { body: { name } })).name).toBe(name);
  }
});
