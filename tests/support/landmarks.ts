// Landmark residues of rotary ATPases, as tests/fixtures/landmarks.json lists them with their evidence.
import { readFixtureJson } from './read-fixture';

export interface Landmark {
  site: string;
  system: string;
  family: string;
  aminoAcid: string;
  label: number;
  sequence: string | null;
  /** From 1; null where the sequence is not at hand. */
  sequenceIndex1: number | null;
}

export const { landmarks, sequences } = readFixtureJson<{
  landmarks: Landmark[];
  sequences: Record<string, string>;
}>('landmarks.json');

/** The residue of an organism that carries the ion. Source: handbook 2.1 (see the rows of the file). */
export function carboxylateOf(system: string, family = 'c'): Landmark {
  const found = landmarks.find(
    (one) => one.site === 'membrane carboxylate' && one.system === system && one.family === family,
  );
  if (!found) throw new Error(`No landmark of ${system} ${family}.`);
  return found;
}
