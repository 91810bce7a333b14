export type TimeForm = 'clock' | 'day' | 'moment';

const forms: Record<TimeForm, Intl.DateTimeFormatOptions> = {
  clock: { hour: '2-digit', minute: '2-digit', hourCycle: 'h23' },
  day: { day: 'numeric', month: 'short', year: 'numeric' },
  moment: { day: 'numeric', month: 'short', hour: '2-digit', minute: '2-digit', hourCycle: 'h23' },
};

/** The moment in words of the reader's zone; an unreadable one is given back as it came. */
export function timeWords(iso: string, form: TimeForm, timeZone?: string): string {
  const date = new Date(iso);
  if (Number.isNaN(date.getTime())) return iso;
  return new Intl.DateTimeFormat('en-GB', { ...forms[form], timeZone }).format(date);
}

/** The full moment with its zone, for the title. */
export function fullTimeWords(iso: string, timeZone?: string): string {
  const date = new Date(iso);
  if (Number.isNaN(date.getTime())) return iso;
  return new Intl.DateTimeFormat('en-GB', { dateStyle: 'full', timeStyle: 'long', timeZone }).format(date);
}
