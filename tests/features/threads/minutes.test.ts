import { subjectKey, type Message } from '@/shared/contracts/threads';
import { byDay, dayWords } from '@/features/threads/minutes';
import { subjectOfKey } from '@/features/threads/subject-of-key';
import { joinLines } from '@/features/threads/thread-lines';

const id = (number: number) => `01a2320f-b4b6-7638-92fa-${String(number).padStart(12, '0')}`;
const stored = (number: number, at: string): Message => ({
  id: id(number),
  threadId: id(1),
  eventNumber: number,
  text: `message ${number}`,
  by: { id: id(2), name: 'Anouk Verrin' },
  at,
  clientKey: id(100 + number),
});

describe('the minutes of a thread', () => {
  const messages = [stored(1, '2026-11-30T23:30:00.000Z'), stored(2, '2026-12-01T00:10:00.000Z')];

  it('stand under the day of the reader, not of the server', () => {
    const inUtc = byDay(joinLines(messages, []), 'UTC');
    expect(inUtc.map(({ key, lines }) => [key, lines.length])).toEqual([
      ['2026-11-30', 1],
      ['2026-12-01', 1],
    ]);
    // An hour east of Greenwich both were written after midnight.
    expect(byDay(joinLines(messages, []), 'Europe/Oslo').map(({ key }) => key)).toEqual(['2026-12-01']);
    expect(dayWords('2026-11-30T12:00:00.000Z', 'UTC')).toBe('Monday 30 November 2026');
  });

  it('show what is on its way last, under the day it was written', () => {
    const queued = {
      clientKey: id(300),
      projectId: id(9),
      subject: { kind: 'mutant' as const, id: id(8) },
      text: 'later',
      queuedAt: Date.parse('2026-12-01T08:00:00.000Z'),
      refusal: null,
    };
    const days = byDay(joinLines(messages, [queued]), 'UTC');
    expect(days.at(-1)?.lines.map(({ state }) => state)).toEqual(['stored', 'waiting']);
  });
});

describe('the key of a subject in an address', () => {
  it('is read back as the subject it was written for', () => {
    for (const subject of [
      { kind: 'residue' as const, proteinId: id(1), residueIndex: 61 },
      { kind: 'annotation' as const, id: id(2) },
      { kind: 'mutant' as const, id: id(3) },
      { kind: 'structure' as const, id: id(4) },
    ])
      expect(subjectOfKey(subjectKey(subject))).toEqual(subject);
  });

  it.each(['residue', `residue:${id(1)}`, `residue:${id(1)}:-1`, `residue:${id(1)}:01`, `page:${id(1)}`, ''])(
    'names nothing when it is "%s"',
    (key) => expect(subjectOfKey(key)).toBeNull(),
  );
});
