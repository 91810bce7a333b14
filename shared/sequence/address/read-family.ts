import { mayBeNegative, readBodies, type AddressBody } from './body';
import { familiesAtStart, type FamilyMatch } from './family-forms';
import type { AddressFamily } from './types';

/** A family at the start of the text and a body behind it. */
export interface FamilyReading {
  match: FamilyMatch;
  body: AddressBody;
  separated: boolean;
}

const SEPARATOR = /^(?: ?[-_./] ?| )/;

/** Bodies behind a family: after a separator, and directly. `b-10` is 10 behind a hyphen, or −10. */
function bodiesBehind(rest: string): { body: AddressBody; separated: boolean }[] {
  const separator = SEPARATOR.exec(rest)?.[0];
  const behind = separator === undefined ? [] : readBodies(rest.slice(separator.length));
  const direct = readBodies(rest).filter((body) => separator === undefined || mayBeNegative(body.label));
  return [
    ...behind.map((body) => ({ body, separated: true })),
    ...direct.map((body) => ({ body, separated: separator !== undefined || rest.startsWith('#') })),
  ];
}

/** One amino-acid letter, a number and a new amino acid: `E59Q`. */
const CHANGE_ALONE = /^[A-Z]\d{1,5}([A-Z*]|[A-Za-z]{3})$/;

/**
 * All readings of the text as a family and a residue of it.
 * - A name in its own case is always one. Behind a separator only such names are, if there are any.
 * - Other case (A for a) and Greek lookalikes (b for β, E for ε) are offered too, for one letter and a number;
 *   with a stated amino acid a name in other case only if none fits as typed and a capital was typed (`CE59`).
 * - `E59Q` is a change of Glu59, not a residue of family E.
 */
export function readFamilies(text: string, families: readonly AddressFamily[]): FamilyReading[] {
  if (CHANGE_ALONE.test(text)) return [];
  const all = familiesAtStart(text, families).flatMap((match) =>
    bodiesBehind(text.slice(match.typed.length)).map((behind) => ({ match, ...behind })),
  );
  const hasExact = all.some(({ match }) => match.how === 'exact');
  return all.filter(({ match, body, separated }) => {
    if (match.how === 'exact') return true;
    if (separated) return !hasExact;
    if (match.how === 'lookalike') return true;
    const typedCapital = match.typed !== match.typed.toLowerCase();
    return body.letter === null || (!hasExact && typedCapital);
  });
}
