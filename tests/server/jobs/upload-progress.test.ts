import { uploadProgress, type ProgressHint } from '@/server/jobs/upload-progress';

describe('hints of progress', () => {
  beforeEach(() => jest.useFakeTimers({ now: new Date('2026-01-01T00:00:00Z') }));
  afterEach(() => jest.useRealTimers());

  it('come at most four times a second, a new stage at once; the job keeps each', () => {
    const hints: ProgressHint[] = [];
    const kept: number[] = [];
    const control = {
      signal: new AbortController().signal,
      progress: (_stage: string, done: number) => kept.push(done),
      complete: async () => {},
    };
    const tell = uploadProgress({ uploadId: 'u', projectId: 'p' }, control, (hint) => hints.push(hint));
    tell('read', 0, 1);
    for (let at = 0; at < 200; at += 1) {
      tell('map', at, 200);
      jest.advanceTimersByTime(10);
    }
    expect(hints[0]).toEqual({ uploadId: 'u', projectId: 'p', stage: 'read', done: 0, total: 1 });
    expect(hints[1]).toMatchObject({ stage: 'map', done: 0, total: 200 });
    // Two seconds of chains: one hint each quarter of a second.
    expect(hints).toHaveLength(1 + 8);
    expect(kept).toHaveLength(201);
  });
});
