import { randomUUID } from 'node:crypto';
import { families, threads } from '@/shared/contracts';
import { addMember, makeProject, signUp } from '@/tests/support/person';
import { startTestServer, type TestServer } from '@/tests/support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

test('a message sent twice under one key is stored once, and its order is its event number', async () => {
  const lead = await signUp(server);
  const project = await makeProject(lead);
  const projectId = project.id;
  const list = await lead.must(families.list, { params: { projectId } });
  const familyId = list.find((family) => family.name === 'c')?.id ?? '';
  await lead.uploadFixture(projectId, { kind: 'alignment', familyId }, 'alignments/c_small_mafft.afa');
  const [protein] = await lead.must(families.proteins, { params: { projectId, familyId } });
  const subject = { kind: 'residue' as const, proteinId: protein?.id ?? '', residueIndex: 60 };
  const contributor = await addMember(lead, projectId, 'contributor');
  const body = { clientKey: randomUUID(), subject, text: 'Is this the one that carries the ion?' };
  const first = await contributor.must(threads.post, { params: { projectId }, body, key: body.clientKey });
  const again = await contributor.must(threads.post, { params: { projectId }, body, key: body.clientKey });
  expect(again).toEqual(first);
  const other = await lead.must(threads.post, {
    params: { projectId },
    body: { clientKey: randomUUID(), subject, text: 'Yes.' },
  });
  expect(other.message.eventNumber).toBeGreaterThan(first.message.eventNumber);
  const key = `residue:${subject.proteinId}:60`;
  const read = await lead.must(threads.ofSubject, { params: { projectId, subjectKey: key } });
  expect(read.messages.map((message) => message.text)).toEqual([body.text, 'Yes.']);
  expect(read.caption).toBe('c D61, ATPE_ECOLI');
});
