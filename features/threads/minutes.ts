import type { ThreadLine } from './thread-lines';

export interface Day {
  /** Year, month and day in the reader's zone, as a key. */
  key: string;
  iso: string;
  lines: ThreadLine[];
}

/** When a line was written, as ISO 8601; one on its way by this device's clock. */
export const momentOf = (line: ThreadLine): string =>
  line.state === 'stored' ? line.message.at : new Date(line.queued.queuedAt).toISOString();

/** Lines under the day they were written on, in the reader's zone. The order stays. */
export function byDay(lines: readonly ThreadLine[], timeZone?: string): Day[] {
  const dayOf = new Intl.DateTimeFormat('sv-SE', { dateStyle: 'short', timeZone });
  const days: Day[] = [];
  for (const line of lines) {
    const iso = momentOf(line);
    const key = dayOf.format(new Date(iso));
    const last = days.at(-1);
    if (last?.key === key) last.lines.push(line);
    else days.push({ key, iso, lines: [line] });
  }
  return days;
}

/** `Monday 30 November 2026`. */
export const dayWords = (iso: string, timeZone?: string): string =>
  new Intl.DateTimeFormat('en-GB', {
    weekday: 'long',
    day: 'numeric',
    month: 'long',
    year: 'numeric',
    timeZone,
  })
    .format(new Date(iso))
    .replace(',', '');
