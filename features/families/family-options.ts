import type { Family } from '@/shared/contracts/families';
import { partWords } from '@/components/residue';

/** Families as a list to choose from: the letter, then what it is in the motor. */
export function familyOptions(families: readonly Family[]): { value: string; label: string }[] {
  return families.map(({ id, name, part, description }) => ({
    value: id,
    label: `${name} · ${description || partWords[part]}`,
  }));
}
