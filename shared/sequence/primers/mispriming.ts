import { reverseComplement, wrap, type Strand } from '../construct/bases';
import { baseIndex } from '../positions';
import type { MisprimingSite } from './types';

/** Rules for a 3′ end that could bind elsewhere [common practice, no source]. */
export const MISPRIMING_RULES = {
  /** `last-15`: so many of the last bases, the very last exactly. */
  windowBases: 15,
  windowMatched: 12,
  seedBases: 5,
  /** `exact-end`: so many last bases, all exact. */
  exactBases: 10,
} as const;

const { windowBases, windowMatched, seedBases, exactBases } = MISPRIMING_RULES;
const SEEDS = 4 ** seedBases;
const LETTERS = 'ACGT';

interface StrandIndex {
  bases: string;
  /** First place of each seed in `places`; one more at the end. */
  firsts: Int32Array;
  places: Int32Array;
}

/** Where each five bases stand, on both strands of a construct. Built once for all its primers. */
export interface PrimingIndex {
  circular: boolean;
  strands: Record<Strand, StrandIndex>;
}

function seedCode(bases: string, start: number): number {
  let code = 0;
  for (let step = 0; step < seedBases; step += 1) {
    const digit = LETTERS.indexOf(bases.charAt(start + step));
    if (digit < 0) return -1;
    code = code * 4 + digit;
  }
  return code;
}

function indexStrand(bases: string, circular: boolean): StrandIndex {
  const around = circular ? bases + bases.slice(0, seedBases - 1) : bases;
  const count = Math.max(0, around.length - seedBases + 1);
  const codes = Int32Array.from({ length: count }, (_, place) => seedCode(around, place));
  const firsts = new Int32Array(SEEDS + 1);
  for (const code of codes) if (code >= 0) firsts[code + 1] = (firsts[code + 1] ?? 0) + 1;
  for (let code = 0; code < SEEDS; code += 1)
    firsts[code + 1] = (firsts[code + 1] ?? 0) + (firsts[code] ?? 0);
  const next = firsts.slice();
  const places = new Int32Array(firsts[SEEDS] ?? 0);
  for (const [place, code] of codes.entries())
    if (code >= 0) {
      const slot = next[code] ?? 0;
      places[slot] = place;
      next[code] = slot + 1;
    }
  return { bases, firsts, places };
}

/** Bases upper case; seeds with a base that is not settled are left out. */
export function buildPrimingIndex(bases: string, circular: boolean): PrimingIndex {
  return {
    circular,
    strands: { '+': indexStrand(bases, circular), '-': indexStrand(reverseComplement(bases), circular) },
  };
}

/** Bases of the primer's 3′ end that fit when its last base lies on index `last` of a strand: in all, and in one run. */
function matchEnd(
  primer: string,
  strand: StrandIndex,
  last: number,
  circular: boolean,
): { matched: number; run: number } {
  const size = strand.bases.length;
  let matched = 0;
  let run = 0;
  for (let step = 0; step < Math.min(windowBases, primer.length); step += 1) {
    const place = circular ? wrap(last - step, size) : last - step;
    if (place < 0 || strand.bases[place] !== primer[primer.length - 1 - step]) continue;
    matched += 1;
    if (run === step) run += 1;
  }
  return { matched, run };
}

/**
 * Places on both strands, besides the intended one, where the 3′ end of a primer (5′→3′) could bind. `intended` is the primer's
 * strand and the index (from 0, on the strand as given) of its 3′ base. Circular constructs are searched across the origin.
 */
export function findMispriming(
  index: PrimingIndex,
  primer: string,
  intended: { strand: Strand; threePrime: number },
): MisprimingSite[] {
  const sites: MisprimingSite[] = [];
  const code = seedCode(primer, primer.length - seedBases);
  if (primer.length < seedBases || code < 0) return sites;
  for (const strand of ['+', '-'] as const) {
    const searched = index.strands[strand];
    const size = searched.bases.length;
    for (let slot = searched.firsts[code] ?? 0; slot < (searched.firsts[code + 1] ?? 0); slot += 1) {
      const last = wrap((searched.places[slot] ?? 0) + seedBases - 1, size);
      const onGiven = strand === '+' ? last : size - 1 - last;
      if (strand === intended.strand && onGiven === intended.threePrime) continue;
      const { matched, run } = matchEnd(primer, searched, last, index.circular);
      const rule = matched >= windowMatched ? 'last-15' : run >= exactBases ? 'exact-end' : null;
      if (rule === null) continue;
      const length = Math.min(windowBases, primer.length);
      const low = strand === '+' ? onGiven - length + 1 : onGiven;
      const start = index.circular ? wrap(low, size) : Math.max(0, low);
      sites.push({ start: baseIndex(start), length, strand, rule, matched });
    }
  }
  return sites;
}
