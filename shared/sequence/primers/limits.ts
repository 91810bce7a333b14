/**
 * Limits of primers for the complementary pair. All "common practice, no source", the formula of the pair rule included
 * (its value agrees with Biopython 1.80, Tm_GC value set 2).
 */
export const PAIR_LIMITS = {
  shortestBases: 25,
  longestBases: 45,
  /** Bases that fit on each side of the change. */
  shortestArm: 10,
  lowestGcPercent: 40,
  highestGcPercent: 60,
  lowestRuleCelsius: 78,
  longestRun: 4,
  longestDinucleotideRepeat: 4,
  /** G or C in the last five bases. */
  strongInLastFive: 3,
  /** Stacks of the last five bases, kcal/mol. */
  lastFiveWeakest: -4,
  lastFiveStrongest: -9,
} as const;

/** Below the first a structure is looked at, below the second it is refused; kcal/mol at 37 °C, 1 M salt. */
export const STRUCTURE_LIMITS = {
  dimerLook: -6,
  dimerAtThreePrimeLook: -5,
  dimerRefused: -9,
  hairpinLook: -2,
  /** Only with a 3′ end paired. */
  hairpinRefused: -4,
} as const;

export const COMMON_PRACTICE = 'common practice, no source';

/** 81.5 + 0.41·%GC − 675/N − %mismatch, in °C: a yes-or-no filter of the complementary pair, never mixed with nearest-neighbour values. */
export function pairRuleCelsius(length: number, gcPercent: number, mismatches: number): number {
  return 81.5 + 0.41 * gcPercent - 675 / length - (100 * mismatches) / length;
}
