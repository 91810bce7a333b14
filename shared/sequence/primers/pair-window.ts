import { countDifferences, readBases } from '../construct/bases';
import { gcPercent } from './gc';
import { PAIR_LIMITS, pairRuleCelsius } from './limits';
import { givenIndex, type PrimerConstruct } from './construct';

/** One codon exchange, by places along the coding strand. */
export interface CodonExchange {
  /** Index in `sense` of the codon's first base. */
  along: number;
  codonTo: string;
}

/** A stretch of the construct that a pair of primers would cover, with what both letters say. */
export interface PairWindow {
  /** Index in `sense` of the first base covered; on a circle it may be negative or go beyond the end. */
  along: number;
  length: number;
  /** Unchanged and changed letters of the coding strand, 5′→3′. */
  original: string;
  changed: string;
  /** Fitting bases before the first and behind the last changed base. */
  armBefore: number;
  armBehind: number;
  mismatches: number;
  gcPercent: number;
  ruleCelsius: number;
}

function isStrong(base: string | undefined): boolean {
  return base === 'G' || base === 'C';
}

/** The window with so many bases before the first codon and behind the last, or null where a linear construct ends or a circle is too small. */
export function pairWindow(
  construct: PrimerConstruct,
  exchanges: readonly CodonExchange[],
  before: number,
  behind: number,
): PairWindow | null {
  const { sense, circular } = construct;
  const first = Math.min(...exchanges.map(({ along }) => along));
  const last = Math.max(...exchanges.map(({ along }) => along));
  const along = first - before;
  const length = last + 3 + behind - along;
  if (length > sense.length || (!circular && (along < 0 || along + length > sense.length))) return null;
  const original = readBases(sense, along, length, '+');
  let changed = original;
  for (const { along: codon, codonTo } of exchanges) {
    const at = codon - along;
    changed = changed.slice(0, at) + codonTo + changed.slice(at + 3);
  }
  const mismatches = countDifferences(original, changed);
  const firstChanged = [...original].findIndex((base, index) => base !== changed[index]);
  let lastChanged = length - 1;
  while (lastChanged > 0 && original[lastChanged] === changed[lastChanged]) lastChanged -= 1;
  const gc = gcPercent(changed);
  return {
    along,
    length,
    original,
    changed,
    armBefore: firstChanged,
    armBehind: length - 1 - lastChanged,
    mismatches,
    gcPercent: gc,
    ruleCelsius: pairRuleCelsius(length, gc, mismatches),
  };
}

/** Limits a window misses by its letters alone; what needs more reckoning is looked at later. */
export function missedByWindow(window: PairWindow): number {
  const { shortestBases, longestBases, shortestArm, lowestGcPercent, lowestRuleCelsius } = PAIR_LIMITS;
  return [
    window.length < shortestBases || window.length > longestBases,
    Math.min(window.armBefore, window.armBehind) < shortestArm,
    window.gcPercent < lowestGcPercent,
    !isStrong(window.changed[0]) || !isStrong(window.changed[window.length - 1]),
    window.ruleCelsius < lowestRuleCelsius,
  ].filter(Boolean).length;
}

/**
 * Windows worth a closer look, best first: fewest missed limits, then nearest above the pair rule, then even arms. Windows that hold
 * a base that is not settled are left out.
 */
export function findWindows(
  construct: PrimerConstruct,
  exchanges: readonly CodonExchange[],
  count: number,
): PairWindow[] {
  const { longestBases, shortestArm } = PAIR_LIMITS;
  const places = exchanges.map(({ along }) => along);
  const span = Math.max(...places) + 3 - Math.min(...places);
  const room = longestBases - span;
  // A changed base may lie at the codon's far side: two of the codon's own bases can count for an arm.
  const shortest = shortestArm - 2;
  const found: { window: PairWindow; missed: number; distance: number }[] = [];
  for (let before = shortest; before <= room - shortest; before += 1)
    for (let behind = shortest; before + behind <= room; behind += 1) {
      const window = pairWindow(construct, exchanges, before, behind);
      if (!window || /[^ACGT]/.test(window.changed)) continue;
      const missed = missedByWindow(window);
      const distance =
        Math.abs(window.ruleCelsius - PAIR_LIMITS.lowestRuleCelsius) +
        0.2 * Math.abs(window.armBefore - window.armBehind);
      found.push({ window, missed, distance });
    }
  return found
    .sort((a, b) => a.missed - b.missed || a.distance - b.distance || a.window.along - b.window.along)
    .slice(0, count)
    .map(({ window }) => window);
}

/** Lowest index a window covers on the strand as given, from 0. */
export function windowStart(construct: PrimerConstruct, window: PairWindow): number {
  const { along, length } = window;
  return givenIndex(construct, construct.coding.strand === '+' ? along : along + length - 1);
}
