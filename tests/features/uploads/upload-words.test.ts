import type { Upload } from '@/shared/contracts/uploads';
import { errorWords } from '@/features/uploads/error-words';
import { excerptView } from '@/features/uploads/excerpt-view';
import { fileSizeWords } from '@/features/uploads/file-size';
import { stageOf } from '@/features/uploads/upload-stage';
import { whyNotSent } from '@/features/uploads/upload-limits';

function uploadOf(change: Partial<Upload>): Upload {
  return {
    id: 'upload',
    kind: 'structure',
    fileName: 'ring.pdb',
    bytes: 10,
    familyId: null,
    state: 'received',
    stage: '',
    done: 0,
    total: 0,
    issues: [],
    alignmentId: null,
    structureId: null,
    by: { id: 'person', name: 'Sana Corrow' },
    at: '2026-12-01T09:00:00.000Z',
    version: 1,
    ...change,
  };
}

describe('where an upload stands', () => {
  it.each([
    [{ state: 'received' as const }, 'read', 'running'],
    [{ state: 'reading' as const, stage: 'read' }, 'read', 'running'],
    [{ state: 'reading' as const, stage: 'map' }, 'map', 'running'],
    [{ state: 'waiting' as const }, 'confirm', 'waiting'],
    [{ state: 'refused' as const }, 'read', 'refused'],
    [{ state: 'done' as const }, 'done', 'done'],
  ])('%j is at %s, %s', (change, stage, state) =>
    expect(stageOf(uploadOf(change))).toMatchObject({ stage, state }),
  );

  it('says which chain is matched, and how far that is', () => {
    const reading = { state: 'reading' as const, stage: 'map', done: 16, total: 32 };
    expect(stageOf(uploadOf(reading))).toMatchObject({
      share: 0.5,
      sentence: 'Matching chain 17 of 32.',
    });
    expect(stageOf(uploadOf({ ...reading, done: 32 })).sentence).toBe('Matching chain 32 of 32.');
  });

  it('leads an alignment past no map and no confirmation', () =>
    expect(stageOf(uploadOf({ kind: 'alignment' })).stages).toEqual(['upload', 'read', 'done']));

  it('always stands at one of its stages', () => {
    for (const kind of ['alignment', 'structure'] as const)
      for (const state of ['received', 'reading', 'refused', 'done'] as const) {
        const { stages, stage } = stageOf(uploadOf({ kind, state, stage: 'map' }));
        expect(stages).toContain(stage);
      }
  });
});

describe('the place of an issue in its file', () => {
  const excerpt = { firstLine: 3, firstColumn: 1, lines: ['>one', 'MKVE', ''] };

  it('marks the character, counted from 1', () => {
    const lines = excerptView(excerpt, { line: 4, column: 2 });
    expect(lines[1]).toEqual({ number: 4, isMarked: true, before: 'M', mark: 'K', after: 'VE' });
    expect(lines.filter(({ isMarked }) => isMarked)).toHaveLength(1);
  });

  it('marks a blank behind the last character, where something is missing', () =>
    expect(excerptView(excerpt, { line: 4, column: 5 })[1]).toMatchObject({
      before: 'MKVE',
      mark: '\u00a0',
    }));

  it('marks the line alone when no column is known', () =>
    expect(excerptView(excerpt, { line: 3 })[0]).toMatchObject({
      isMarked: true,
      before: '>one',
      mark: '',
    }));

  it('counts characters, not code units', () => {
    const wide = { firstLine: 1, firstColumn: 1, lines: ['𝛼J'] };
    expect(excerptView(wide, { line: 1, column: 2 })[0]?.mark).toBe('J');
  });

  it('finds the character in lines that are shown from further on', () => {
    const further = { firstLine: 1, firstColumn: 301, lines: ['MKJE'] };
    expect(excerptView(further, { line: 1, column: 303 })[0]).toMatchObject({ before: 'MK', mark: 'J' });
  });
});

describe('files before they are sent', () => {
  it.each([
    [0, '0 bytes'],
    [1, '1 byte'],
    [21_400, '21 kB'],
    [999_600, '1.0 MB'],
    [4_100_000, '4.1 MB'],
    [25_000_000, '25 MB'],
  ])('%d bytes read %s', (bytes, words) => expect(fileSizeWords(bytes)).toBe(words));

  it('refuses an empty file and one that is too large, and says why', () => {
    expect(whyNotSent('alignment', { name: 'c.afa', size: 0 })).toMatch(/^c\.afa is empty/);
    expect(whyNotSent('alignment', { name: 'c.afa', size: 65 * 1024 * 1024 })).toMatch(/more than the 64 MB/);
    expect(whyNotSent('structure', { name: 'r.pdb', size: 65 * 1024 * 1024 })).toBeNull();
  });
});

describe('how many errors a file has', () => {
  const wrong = { code: 'letter-unknown', severity: 'error' as const, message: 'wrong' };
  const doubt = { code: 'rows-equal', severity: 'warning' as const, message: 'doubt' };
  const more = {
    code: 'more-issues',
    severity: 'error' as const,
    message: '19800 more problems are not listed.',
  };
  it.each([
    [[wrong, doubt], 'an error'],
    [[wrong, wrong, doubt], '2 errors'],
    [[wrong, wrong, more], '2 errors or more'],
    [[wrong, { ...more, severity: 'warning' as const }], 'an error, and more'],
  ])('%#', (issues, words) => expect(errorWords(issues)).toBe(words));
});
