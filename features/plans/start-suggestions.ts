import { readBases, reverseComplement, wrap, type Strand } from '@/shared/sequence/construct/bases';
import { readCoding } from '@/shared/sequence/construct/coding';
import { findProtein } from '@/shared/sequence/construct/find-protein';
import { isStartCodon, translateCodon, type GeneticCodeId } from '@/shared/sequence/construct/genetic-code';
import { matchProtein } from '@/shared/sequence/construct/match-protein';

/** A start of the coding part whose frame encodes the protein. */
export interface StartSuggestion {
  /** First base from 1, on the strand as it should be given. */
  start: number;
  codon: string;
  /** `-`: the DNA has to be turned round first; `start` counts in the turned DNA. */
  strand: Strand;
  /** Residues encoded before the protein begins. */
  residuesBefore: number;
  /** Letter by letter, or with differences. */
  exact: boolean;
}

interface Search {
  bases: string;
  circular: boolean;
  table: GeneticCodeId;
  protein: string;
}

const suggestionsShown = 4;
const openFramesTried = 3;

/**
 * Starts whose frame encodes the protein: where it begins, and the first start codon of a tag before it, on either strand.
 * Where it is encoded nowhere letter by letter, the longest open frames that match it well enough.
 */
export function suggestStarts(search: Search): StartSuggestion[] {
  const { bases, circular, table, protein } = search;
  const places = findProtein(bases, circular, protein, table);
  const found = places.flatMap(({ strand, start }) => {
    const sense = strand === '+' ? bases : reverseComplement(bases);
    const along = strand === '+' ? start : bases.length - 1 - start;
    return startsBefore({ ...search, bases: sense }, along).map((one) => ({ ...one, strand, exact: true }));
  });
  return (found.length > 0 ? found : openFrames(search)).slice(0, suggestionsShown);
}

/** The place itself and the furthest start codon upstream of it in its frame, before any stop. */
function startsBefore({ bases, circular, table }: Search, place: number) {
  const size = bases.length;
  const codonAt = (steps: number) => readBases(bases, place - 3 * steps, 3, '+');
  const starts = [{ start: place + 1, codon: codonAt(0), residuesBefore: 0 }];
  let furthest = 0;
  for (let steps = 1; 3 * steps < size && (circular || place - 3 * steps >= 0); steps += 1) {
    const codon = codonAt(steps);
    if (translateCodon(codon, table) === '*') break;
    if (codon === 'ATG') furthest = steps;
  }
  if (furthest > 0)
    starts.push({
      start: wrap(place - 3 * furthest, size) + 1,
      codon: codonAt(furthest),
      residuesBefore: furthest,
    });
  // A protein that does not begin with a start codon is made from the one before it.
  const [own] = starts;
  return own && furthest > 0 && !isStartCodon(own.codon, table) ? starts.reverse() : starts;
}

function openFrames(search: Search): StartSuggestion[] {
  const strands = ['+', '-'] as const;
  return strands
    .flatMap((strand) => {
      const bases = strand === '+' ? search.bases : reverseComplement(search.bases);
      return longestFrames({ ...search, bases }).map((frame) => ({ ...frame, strand, bases }));
    })
    .sort((one, other) => other.codons - one.codons)
    .slice(0, openFramesTried)
    .flatMap(({ start, strand, bases }) => {
      const { circular, table, protein } = search;
      const coding = readCoding({ bases, circular, start, table }).value;
      const match = coding && matchProtein(coding, protein).value;
      const [first] = match?.segments ?? [];
      if (!first) return [];
      const residuesBefore = first.codon;
      return [{ start, codon: 'ATG', strand, residuesBefore, exact: false }];
    });
}

/** The first ATG of each open frame, with its length in codons, longest first. */
function longestFrames({ bases, table }: Search): { start: number; codons: number }[] {
  const frames: { start: number; codons: number }[] = [];
  for (let frame = 0; frame < 3; frame += 1) {
    let open = -1;
    for (let at = frame; at + 3 <= bases.length; at += 3) {
      const codon = bases.slice(at, at + 3);
      if (open < 0 && codon === 'ATG') open = at;
      else if (open >= 0 && translateCodon(codon, table) === '*') {
        frames.push({ start: open + 1, codons: (at - open) / 3 });
        open = -1;
      }
    }
    if (open >= 0) frames.push({ start: open + 1, codons: Math.floor((bases.length - open) / 3) });
  }
  return frames.sort((one, other) => other.codons - one.codons).slice(0, openFramesTried);
}
