// Reference answers, as rows of the screens would show them.
import { carboxylateOf } from '@/tests/support/landmarks';
import { readFixtureJson } from '@/tests/support/read-fixture';

interface ExpectedAlignment {
  alignments: { ids: string[]; ungapped_lengths: number[] }[];
}

/** Rows of an aligned file with their residues, in the order of the file. Source: Biopython 1.80 (see the file). */
export function proteinsOf(file: string): string[][] {
  const [alignment] = readFixtureJson<ExpectedAlignment>(`expected/alignments/${file}.json`).alignments;
  if (!alignment) throw new Error(`${file} holds no alignment.`);
  return alignment.ids.map((id, place) => [id, String(alignment.ungapped_lengths[place])]);
}

/** `E59`: the residue that carries the ion in an organism. Source: handbook 2.1, as in landmarks.json (see its rows). */
export function carboxylateName(system: string, family?: string): string {
  const { aminoAcid, label } = carboxylateOf(system, family);
  return `${aminoAcid}${label}`;
}

type Place = [number: string, letter: string, column: number, rowLetter: string];
interface ExpectedMaps {
  jobs: { structure: string; chain: string; mapping: Place[] }[];
}

/**
 * Author number, letter and column (from 1) on both sides of each break of a chain's numbers, and at its end.
 * Source: mapping.json, made with Biopython 1.80 (see the file).
 */
export function placesAtBreaks(structure: string, chain: string): Place[] {
  const { jobs } = readFixtureJson<ExpectedMaps>('expected/mapping.json');
  const mapping = jobs.find((one) => one.structure === structure && one.chain === chain)?.mapping ?? [];
  const isNext = (one: Place, other: Place | undefined) => other && Number(other[0]) === Number(one[0]) + 1;
  return mapping.filter((one, at) => {
    const before = mapping[at - 1];
    return !isNext(one, mapping[at + 1]) || (before !== undefined && !isNext(before, one));
  });
}

/** What stands on every primer list and export. Source: handbook 13. */
export const primerCaution =
  "Check the design before you order. Follow your institution's rules on biosafety and recombinant DNA; this tool does not replace review by a qualified person.";
export const figuresCaution = 'Calculated for the stated concentrations; real reactions differ.';
