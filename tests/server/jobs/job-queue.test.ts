import { readFileSync } from 'node:fs';
import path from 'node:path';
import { alignments, families, uploads } from '@/shared/contracts';
import { Job } from '@/server/db/entities';
import {
  claimStatement,
  JobQueue,
  JobRunner,
  LeaseLost,
  readAlignmentJob,
  WorkerPool,
  type JobControl,
  type JobHandler,
} from '@/server/jobs';
import { createLog } from '@/server/lib/log';
import * as alignmentModule from '@/server/modules/alignments';
import * as familyModule from '@/server/modules/families';
import * as uploadModule from '@/server/modules/uploads';
import { makeProject, signUp, type TestPerson } from '../../support/person';
import { startTestServer, type TestServer } from '../../support/server';

jest.setTimeout(60_000);

let server: TestServer;
let lead: TestPerson;
let projectId: string;
let familyId: string;
const bytes = readFileSync(path.join(__dirname, '../../fixtures/alignments/c_small_mafft.afa'));
const log = createLog('silent');
const never = new AbortController().signal;

beforeAll(async () => {
  server = await startTestServer();
  // The jobs of these tests are taken by the tests themselves.
  await server.container.jobs.stop();
  lead = await signUp(server);
});
beforeEach(async () => {
  await server.container.source.query('DELETE FROM job');
  projectId = (await makeProject(lead)).id;
  familyId =
    (await lead.must(families.list, { params: { projectId } })).find(({ name }) => name === 'c')?.id ?? '';
});
afterAll(() => server.close());

const manager = () => server.container.source.manager;
const queue = (lease?: number) => new JobQueue(server.container.unitOfWork, lease);
const sendUpload = async () => {
  const { body } = await lead.upload(projectId, { kind: 'alignment', familyId }, 'c.afa', bytes);
  return body.id;
};
const addJobs = (count: number, kind = 'test') =>
  server.container.unitOfWork.write({ projectId: null, actorId: lead.id }, async (unit) => {
    for (let at = 0; at < count; at += 1) await unit.enqueue({ kind, subjectId: `${at}`, payload: {} });
  });
const stateOf = async (uploadId: string) =>
  (await lead.must(uploads.read, { params: { projectId, uploadId } })).state;

/** The reader as the server has it, on parts of its own. */
function reader(pool: WorkerPool): JobHandler {
  const { unitOfWork, files, people, proteins, mapQueries, familyQueries } = server.container;
  const queries = new uploadModule.UploadQueries(unitOfWork, people, files);
  return readAlignmentJob({
    unitOfWork,
    files,
    pool,
    states: new uploadModule.UploadStates(queries, mapQueries),
    families: new familyModule.FamilyService(unitOfWork, never as never, familyQueries),
    alignments: new alignmentModule.AlignmentQueries(unitOfWork, people, proteins),
    onProgress: () => {},
  });
}
const controlOf = (of: JobQueue, job: Parameters<JobQueue['heartbeat']>[0]): JobControl => ({
  signal: never,
  progress: () => {},
  complete: (unit) => of.complete(unit, job, 'done'),
});

describe('taking jobs', () => {
  it('locks only the row it takes, found through the index in claim order', async () => {
    expect(claimStatement).toMatch(
      /WHERE state = 'ready' AND run_at <= \? ORDER BY run_at, id LIMIT 1 FOR UPDATE SKIP LOCKED$/,
    );
    await addJobs(40);
    const [plan]: { key: string | null; Extra: string }[] = await manager().query(
      `EXPLAIN ${claimStatement}`,
      [new Date()],
    );
    expect(plan?.key).toMatch(/^IDX_/);
    expect(plan?.Extra ?? '').not.toMatch(/filesort|temporary/);
  });

  it('gives each job to one taker, however many take at once', async () => {
    await addJobs(30);
    const takers = [queue(), queue(), queue(), queue()];
    const taken: string[] = [];
    await Promise.all(
      takers.map(async (taker) => {
        for (let job = await taker.claim(); job; job = await taker.claim()) taken.push(job.id);
      }),
    );
    expect(taken).toHaveLength(30);
    expect(new Set(taken).size).toBe(30);
  });

  it('waits until a job is due', async () => {
    await addJobs(1);
    await manager().update(Job, { kind: 'test' }, { runAt: new Date(Date.now() + 60_000) });
    expect(await queue().claim()).toBeNull();
    expect(await queue().claim(new Date(Date.now() + 61_000))).not.toBeNull();
  });
});

describe('an upload’s job', () => {
  let pool: WorkerPool;
  beforeAll(() => {
    pool = new WorkerPool(400, 1);
  });
  afterAll(() => pool.close());

  it('done twice at the same time stores once', async () => {
    const uploadId = await sendUpload();
    const [one, other] = [queue(1), queue(30_000)];
    const first = await one.claim(new Date(Date.now() + 10));
    if (!first) throw new Error('No job to take.');
    // The first taker is slow: its lease runs out, and another takes the same job.
    await other.releaseExpired(new Date(Date.now() + 1000));
    const second = await other.claim();
    expect(second?.id).toBe(first.id);
    if (!second) return;
    const results = await Promise.allSettled([
      reader(pool).run(first, controlOf(one, first)),
      reader(pool).run(second, controlOf(other, second)),
    ]);
    expect(results[0]).toMatchObject({ status: 'rejected', reason: expect.any(LeaseLost) });
    expect(results[1]?.status).toBe('fulfilled');
    expect(await stateOf(uploadId)).toBe('done');
    expect(await lead.must(alignments.list, { params: { projectId } })).toHaveLength(1);
    expect(await lead.must(families.proteins, { params: { projectId, familyId } })).toHaveLength(5);
  });

  it('whose lease is lost stores nothing', async () => {
    const uploadId = await sendUpload();
    const taker = queue(1);
    const job = await taker.claim();
    if (!job) throw new Error('No job to take.');
    await queue().releaseExpired(new Date(Date.now() + 1000));
    await expect(reader(pool).run(job, controlOf(taker, job))).rejects.toBeInstanceOf(LeaseLost);
    expect(await stateOf(uploadId)).toBe('reading');
    expect(await lead.must(alignments.list, { params: { projectId } })).toEqual([]);
    expect(await lead.must(families.proteins, { params: { projectId, familyId } })).toEqual([]);
    expect(await taker.heartbeat(job, { stage: '', done: 0, total: 0 })).toBe(false);
  });

  it('left by a process that was killed is taken up again and finished', async () => {
    const uploadId = await sendUpload();
    // Taken, begun, and then never heard of again.
    expect(await queue(50).claim()).not.toBeNull();
    await new Promise((done) => setTimeout(done, 80));
    const runner = new JobRunner(queue(), { 'alignment.read': reader(pool) }, log, { pollMilliseconds: 50 });
    runner.start();
    expect((await lead.settled(projectId, uploadId)).state).toBe('done');
    await runner.stop();
    const [job] = await manager().findBy(Job, { subjectId: uploadId });
    expect(job).toMatchObject({ state: 'done', attempts: 2, leaseUntil: null });
  });

  it('is read however often servers were killed or stopped under it, within reason', async () => {
    const uploadId = await sendUpload();
    await manager().update(Job, { subjectId: uploadId }, { attempts: 19 });
    const runner = new JobRunner(queue(), { 'alignment.read': reader(pool) }, log, { pollMilliseconds: 50 });
    runner.start();
    expect((await lead.settled(projectId, uploadId)).state).toBe('done');
    await runner.stop();
  });

  it.each([
    ['failures', 4, 'Error: no such luck'],
    ['ends of its server', 20, null],
  ])('given up after too many %s refuses the upload with words', async (_, attempts, error) => {
    const uploadId = await sendUpload();
    await manager().update(Job, { subjectId: uploadId }, { attempts, error });
    const runner = new JobRunner(queue(), { 'alignment.read': reader(pool) }, log, { pollMilliseconds: 50 });
    runner.start();
    const upload = await lead.settled(projectId, uploadId);
    await runner.stop();
    expect(upload).toMatchObject({
      state: 'refused',
      issues: [{ code: 'reading-failed', severity: 'error' }],
    });
    expect(await manager().findOneBy(Job, { subjectId: uploadId })).toMatchObject({ state: 'failed' });
  });

  it('that takes too much memory refuses the upload; the next is read', async () => {
    const row = (at: number) => `>row${at}\n${'ACDEFGHIKLMNPQRSTVWY'.repeat(100)}\n`;
    const large = new TextEncoder().encode(Array.from({ length: 25_000 }, (_, at) => row(at)).join(''));
    const small = new WorkerPool(64, 1);
    const { body } = await lead.upload(projectId, { kind: 'alignment', familyId }, 'large.afa', large);
    const runner = new JobRunner(queue(), { 'alignment.read': reader(small) }, log, { pollMilliseconds: 50 });
    runner.start();
    expect((await lead.settled(projectId, body.id)).issues.map((issue) => issue.code)).toEqual([
      'too-much-memory',
    ]);
    const next = await sendUpload();
    runner.wake();
    expect((await lead.settled(projectId, next)).state).toBe('done');
    await runner.stop();
    await small.close();
  });
});

describe('a runner', () => {
  it('tries again after a growing wait, and notes what went wrong', async () => {
    await addJobs(1);
    const at: number[] = [];
    const handler: JobHandler = {
      run: async () => {
        at.push(Date.now());
        throw new Error('no such luck');
      },
      giveUp: async (_job, control) => {
        at.push(Date.now());
        await server.container.unitOfWork.write({ projectId: null, actorId: lead.id }, (unit) =>
          control.complete(unit),
        );
      },
    };
    const settings = { pollMilliseconds: 20, attempts: 3, firstWaitMilliseconds: 100 };
    const runner = new JobRunner(queue(), { test: handler }, log, settings);
    runner.start();
    for (let tries = 0; tries < 200 && at.length < 4; tries += 1)
      await new Promise((done) => setTimeout(done, 25));
    await runner.stop();
    expect(at).toHaveLength(4);
    const waits = at.slice(1).map((moment, index) => moment - (at[index] ?? 0));
    expect(waits[0]).toBeGreaterThanOrEqual(95);
    expect(waits[1]).toBeGreaterThanOrEqual(195);
    expect(waits[2]).toBeGreaterThanOrEqual(395);
    expect(await manager().findOneBy(Job, { kind: 'test' })).toMatchObject({
      state: 'failed',
      error: 'Error: no such luck',
    });
  });

  it('keeps its lease while it works, and stops at once when it is told to, leaving the job to others', async () => {
    await addJobs(1);
    let begun = () => {};
    const started = new Promise<void>((done) => (begun = done));
    const handler: JobHandler = {
      run: (_job, control) =>
        new Promise((_done, fail) => {
          control.progress('read', 3, 7);
          begun();
          control.signal.addEventListener('abort', () => fail(new Error('cut off')));
        }),
      giveUp: async () => {},
    };
    const runner = new JobRunner(queue(300), { test: handler }, log, { pollMilliseconds: 20 });
    runner.start();
    await started;
    await new Promise((done) => setTimeout(done, 700));
    expect(await manager().findOneBy(Job, { kind: 'test' })).toMatchObject({
      state: 'running',
      attempts: 1,
      stage: 'read',
      done: 3,
      total: 7,
    });
    await runner.stop();
    expect(await manager().findOneBy(Job, { kind: 'test' })).toMatchObject({
      state: 'ready',
      leasedBy: null,
    });
  });
});
