import type { Reading } from '@/shared/contracts/residues';

export interface ReadingGroup {
  title: string;
  spelling: string;
  /** Place of each reading in the whole list. */
  readings: { reading: Reading; at: number }[];
}

/** Neighbours of one kind under one heading; the order stays as it came, so a kind may have two headings. */
export function groupReadings(readings: readonly Reading[]): ReadingGroup[] {
  const groups: ReadingGroup[] = [];
  readings.forEach((reading, at) => {
    const last = groups.at(-1);
    if (last?.title === reading.group) last.readings.push({ reading, at });
    else groups.push({ title: reading.group, spelling: reading.spelling, readings: [{ reading, at }] });
  });
  return groups;
}

/** The one reading that may be opened without choosing: the only one there is, with the letter that stands there. */
export function onlyReading(found: { readings: readonly Reading[]; more: boolean }): Reading | null {
  const [only] = found.readings;
  return only && found.readings.length === 1 && !found.more && only.mismatch === null ? only : null;
}
