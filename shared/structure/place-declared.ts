import type { MissingResidue } from './draft';

export interface ObservedResidue {
  name: string;
  letter: string;
  authorNumber: number;
  insertionCode: string;
}

export interface DeclaredSequence {
  names: readonly string[];
  letters: string;
}

/** By observed residue: its index in the declared sequence, from 0; undefined where it has no place in it. */
export type Placement = (number | undefined)[];

/**
 * Walks along the declared sequence, taking at each step the next observed or the next missing residue, whichever
 * fits; by number where both do. Null unless the merged list equals the declared one exactly.
 */
export function placeByMissing(
  observed: readonly ObservedResidue[],
  missing: readonly MissingResidue[],
  declared: DeclaredSequence,
): Placement | null {
  if (observed.length + missing.length !== declared.names.length) return null;
  const placement: Placement = [];
  let skipped = 0;
  for (const [index, name] of declared.names.entries()) {
    const seen = observed[placement.length];
    const unseen = missing[skipped];
    const seenFits = seen?.name === name;
    const unseenFits = unseen?.name === name;
    if (seenFits && !(unseenFits && precedes(unseen, seen))) placement.push(index);
    else if (unseenFits) skipped++;
    else return null;
  }
  return placement;
}

/** Above this product of lengths a search for a piece of text is not tried. */
const SEARCH_LIMIT = 1e9;

/** The observed sequence as one unbroken piece of the declared one, if it is found there once and only once. */
export function placeWhole(
  observed: readonly ObservedResidue[],
  declared: DeclaredSequence,
): Placement | null {
  if (observed.length === 0 || observed.length * declared.letters.length > SEARCH_LIMIT) return null;
  const letters = observed.map((residue) => residue.letter).join('');
  const at = declared.letters.indexOf(letters);
  if (at < 0 || declared.letters.indexOf(letters, at + 1) >= 0) return null;
  return observed.map((_, index) => at + index);
}

/**
 * Finds the place that a free residue (after the chain's end) has in the declared sequence: the one its number names,
 * counted from the placed residue nearest in number, if it is not taken and holds this component.
 */
export function freePlaces(
  placed: readonly ObservedResidue[],
  placement: Placement,
  declared: DeclaredSequence,
): (free: ObservedResidue) => number | undefined {
  const taken = new Set(placement);
  const anchors = placed
    .map((residue, at) => ({ authorNumber: residue.authorNumber, index: placement[at] }))
    .filter((anchor) => anchor.index !== undefined)
    .sort((a, b) => a.authorNumber - b.authorNumber);
  return (free) => {
    let low = 0;
    let high = anchors.length;
    while (low < high) {
      const middle = (low + high) >> 1;
      if ((anchors[middle]?.authorNumber ?? 0) < free.authorNumber) low = middle + 1;
      else high = middle;
    }
    const below = anchors[low - 1];
    const above = anchors[low];
    const fromBelow = below ? free.authorNumber - below.authorNumber : Infinity;
    const fromAbove = above ? above.authorNumber - free.authorNumber : Infinity;
    const anchor = fromBelow <= fromAbove ? below : above;
    if (anchor?.index === undefined) return undefined;
    const place = anchor.index + free.authorNumber - anchor.authorNumber;
    if (declared.names[place] !== free.name || taken.has(place)) return undefined;
    taken.add(place);
    return place;
  };
}

function precedes(
  a: { authorNumber: number; insertionCode: string },
  b: { authorNumber: number; insertionCode: string },
): boolean {
  return (
    a.authorNumber < b.authorNumber ||
    (a.authorNumber === b.authorNumber && a.insertionCode < b.insertionCode)
  );
}
