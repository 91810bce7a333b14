import { randomUUID } from 'node:crypto';
import { projects, threads } from '@/shared/contracts';
import { startTestServer, type TestServer } from '@/tests/support/server';
import { stageAlignment, type Stage } from '@/tests/support/stage';

let server: TestServer;
let stage: Stage;
beforeAll(async () => {
  server = await startTestServer();
  stage = await stageAlignment(server);
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
