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

/** Why it is a reading, clause by clause; the numbering stands beside the name already. */
const clausesOf = ({ reason, residue }: Reading): string[] =>
  reason.split('; ').filter((clause) => clause !== residue.numbering);

/** What all readings under a heading are read by is said once there; the rest stands with each. */
export function reasonsOf({ readings }: ReadingGroup): { shared: string; own: string[] } {
  const all = readings.map(({ reading }) => clausesOf(reading));
  const [first = [], ...others] = all;
  const shared =
    others.length === 0 ? [] : first.filter((clause) => others.every((one) => one.includes(clause)));
  return {
    shared: shared.join('; '),
    own: all.map((clauses) => clauses.filter((clause) => !shared.includes(clause)).join('; ')),
  };
}

/** The one reading that may be opened without choosing: the only one there is, with the letter that stands there. */
export function onlyReading(found: { readings: readonly Reading[]; more: boolean }): Reading | null {
  const [only] = found.readings;
  return only && found.readings.length === 1 && !found.more && only.mismatch === null ? only : null;
}
