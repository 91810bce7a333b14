import { readBases, reverseComplement, wrap, type Strand } from '../construct/bases';
import type { ProofDifference } from './types';

/** Bases of a primer's 3′ end that must fit the template exactly for it to bind. */
export const SHORTEST_ANCHOR = 10;

interface Anchor {
  strand: Strand;
  /** Index on that strand, read 5′→3′, just behind the primer's 3′ base. */
  end: number;
  length: number;
}

/** Where the longest 3′ end of a primer fits exactly, on either strand. */
function findAnchors(primer: string, sense: Record<Strand, string>, circular: boolean): Anchor[] {
  const probe = primer.slice(-SHORTEST_ANCHOR);
  if (probe.length < SHORTEST_ANCHOR) return [];
  let best: Anchor[] = [];
  for (const strand of ['+', '-'] as const) {
    const bases = sense[strand];
    const size = bases.length;
    const around = circular ? bases + bases.slice(0, SHORTEST_ANCHOR - 1) : bases;
    for (let at = around.indexOf(probe); at >= 0; at = around.indexOf(probe, at + 1)) {
      let length = SHORTEST_ANCHOR;
      let before = at - 1;
      while (length < Math.min(primer.length, size)) {
        const place = circular ? wrap(before, size) : before;
        if (place < 0 || bases[place] !== primer[primer.length - 1 - length]) break;
        length += 1;
        before -= 1;
      }
      const anchor = { strand, end: at + SHORTEST_ANCHOR, length };
      if (length > (best[0]?.length ?? 0)) best = [anchor];
      else if (length === best[0]?.length) best.push(anchor);
    }
  }
  return best;
}

/** Where the template's first base comes to lie in a circle that begins with the primer, or null when it was replaced. */
function originInCircle(
  primer: number,
  size: number,
  begin: number,
  end: number,
  headFits: number,
  tailFits: number,
): number | null {
  const fromBegin = wrap(-begin, size);
  if (fromBegin < headFits) return fromBegin;
  const beforeEnd = wrap(end, size);
  if (beforeEnd > 0 && beforeEnd <= tailFits) return primer - beforeEnd;
  const replaced = wrap(end - begin, size);
  if (fromBegin < replaced) return replaced === primer ? fromBegin : null;
  return primer + wrap(-end, size);
}

/**
 * DNA that a fully complementary pair makes, built from the primers' letters alone: the 3′ end of each is found on the template, the
 * strand grows from there round to where the other primer's 3′ end lies.
 */
export function buildPairProduct(
  bases: string,
  circular: boolean,
  first: string,
  second: string,
): { product: string } | { difference: ProofDifference } {
  const fail = (code: ProofDifference['code'], message: string) => ({ difference: { code, message } });
  if (reverseComplement(second) !== first)
    return fail('primers-do-not-pair', 'The two primers are not complementary along their whole length.');
  const sense: Record<Strand, string> = { '+': bases, '-': reverseComplement(bases) };
  const size = bases.length;
  const heads = findAnchors(second, sense, circular);
  const tails = findAnchors(first, sense, circular);
  if (heads.length > 1 || tails.length > 1)
    return fail(
      'primers-anneal-in-several-places',
      'A 3′ end fits the construct equally well in several places.',
    );
  const [head] = heads;
  const [tail] = tails;
  if (!head || !tail || head.strand === tail.strand)
    return fail(
      'primers-do-not-anneal',
      `The last ${SHORTEST_ANCHOR} bases of a primer do not fit the construct.`,
    );
  const template = sense[tail.strand];
  // The other primer's 3′ end on its own strand is the 5′ edge of the change on this one.
  const begin = circular ? wrap(size - head.end, size) : size - head.end;
  const end = circular ? wrap(tail.end, size) : tail.end;
  let product: string;
  if (circular) {
    const copied = readBases(template, end, wrap(begin - end, size), '+');
    const origin = originInCircle(first.length, size, begin, end, head.length, tail.length);
    if (origin === null) return fail('primers-do-not-anneal', 'The first base of the construct is replaced.');
    const circle = first + copied;
    product = circle.slice(origin) + circle.slice(0, origin);
  } else {
    if (begin > end)
      return fail('primers-do-not-anneal', 'The primers do not lie over one another on the construct.');
    product = template.slice(0, begin) + first + template.slice(end);
  }
  return { product: tail.strand === '+' ? product : reverseComplement(product) };
}
