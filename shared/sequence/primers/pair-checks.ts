import type { Strand } from '../construct/bases';
import { findHairpin, findSelfDimer, stackSumKcalPerMol } from './dimer';
import { gcAtEnd, longestDinucleotideRepeat, longestRun } from './gc';
import { COMMON_PRACTICE, PAIR_LIMITS, STRUCTURE_LIMITS } from './limits';
import type { PairWindow } from './pair-window';
import type { Check, Primer } from './types';

type Verdict = Pick<Check, 'severity' | 'passed'>;

const limit = (passed: boolean): Verdict => ({ severity: 'limit', passed });
const advice = (passed: boolean): Verdict => ({ severity: 'advice', passed });
/** Two limits on one figure: below the second it is refused, between them looked at. */
const graded = (look: boolean, refused: boolean): Verdict => (refused ? limit(false) : advice(!look));

function check(
  name: string,
  label: string,
  value: number | null,
  text: string,
  verdict: Verdict,
  primer?: string,
): Check {
  return {
    name,
    label,
    ...(primer ? { primer } : {}),
    ...verdict,
    value,
    limit: text,
    basis: COMMON_PRACTICE,
  };
}

/** The rule's formula stands with its figure: two other temperatures stand beside it and mean something else. */
const pairRuleBasis = `81.5 + 0.41 × % G and C − 675 ÷ bases − % mismatched; ${COMMON_PRACTICE}`;

/** Checks of what both primers share. */
export function checkWindow(window: PairWindow): Check[] {
  const { shortestBases, longestBases, shortestArm, lowestGcPercent, highestGcPercent, lowestRuleCelsius } =
    PAIR_LIMITS;
  const { length, changed, gcPercent, ruleCelsius } = window;
  const arm = Math.min(window.armBefore, window.armBehind);
  const strongEnds = gcAtEnd(changed.slice(0, 1), 1) + gcAtEnd(changed, 1);
  const tooPoor = gcPercent < lowestGcPercent;
  return [
    {
      ...check(
        'pair-rule-melting',
        'Melting by the pair rule, °C',
        ruleCelsius,
        `at least ${lowestRuleCelsius}`,
        limit(ruleCelsius >= lowestRuleCelsius),
      ),
      basis: pairRuleBasis,
    },
    check(
      'length',
      'Bases',
      length,
      `${shortestBases} to ${longestBases}`,
      limit(length >= shortestBases && length <= longestBases),
    ),
    check(
      'arm-length',
      'Fitting bases beside the change',
      arm,
      `at least ${shortestArm}`,
      limit(arm >= shortestArm),
    ),
    check(
      'gc-percent',
      'G and C share, %',
      gcPercent,
      `${lowestGcPercent} to ${highestGcPercent}`,
      graded(gcPercent > highestGcPercent, tooPoor),
    ),
    check('strong-ends', 'Ends that are G or C', strongEnds, 'both', limit(strongEnds === 2)),
    check(
      'longest-run',
      'Longest run of one base',
      longestRun(changed),
      `at most ${PAIR_LIMITS.longestRun}`,
      advice(longestRun(changed) <= PAIR_LIMITS.longestRun),
    ),
    check(
      'dinucleotide-repeat',
      'Longest repeat of two bases',
      longestDinucleotideRepeat(changed),
      `at most ${PAIR_LIMITS.longestDinucleotideRepeat}`,
      advice(longestDinucleotideRepeat(changed) <= PAIR_LIMITS.longestDinucleotideRepeat),
    ),
  ];
}

export interface StructureFigures {
  hairpinKcalPerMol: number;
  selfDimerKcalPerMol: number;
  checks: Check[];
}

/** Hairpin, self dimer and 3′ end of one primer, with their checks. */
export function checkStructure(name: string, bases: string): StructureFigures {
  const { dimerLook, dimerAtThreePrimeLook, dimerRefused, hairpinLook, hairpinRefused } = STRUCTURE_LIMITS;
  const hairpin = findHairpin(bases);
  const dimers = findSelfDimer(bases);
  const hairpinKcalPerMol = hairpin?.kcalPerMol ?? 0;
  const selfDimerKcalPerMol = dimers.best?.kcalPerMol ?? 0;
  const atEnd = dimers.bestAtThreePrime?.kcalPerMol ?? 0;
  const refusedHairpin = hairpinKcalPerMol < hairpinRefused && hairpin?.threePrimePaired === true;
  const lastFive = stackSumKcalPerMol(bases.slice(-5));
  const strong = gcAtEnd(bases, 5);
  const { lastFiveWeakest, lastFiveStrongest, strongInLastFive } = PAIR_LIMITS;
  return {
    hairpinKcalPerMol,
    selfDimerKcalPerMol,
    checks: [
      check(
        'hairpin',
        'Hairpin, kcal/mol',
        hairpinKcalPerMol,
        `look below ${hairpinLook}, not below ${hairpinRefused} with the 3′ end paired`,
        graded(hairpinKcalPerMol < hairpinLook, refusedHairpin),
        name,
      ),
      check(
        'self-dimer',
        'Self dimer, kcal/mol',
        selfDimerKcalPerMol,
        `look below ${dimerLook}, not below ${dimerRefused}`,
        graded(selfDimerKcalPerMol < dimerLook, selfDimerKcalPerMol < dimerRefused),
        name,
      ),
      check(
        'self-dimer-three-prime',
        'Self dimer that holds the 3′ end, kcal/mol',
        atEnd,
        `look below ${dimerAtThreePrimeLook}`,
        advice(atEnd >= dimerAtThreePrimeLook),
        name,
      ),
      check(
        'three-prime-stacks',
        'Stacks of the last five bases, kcal/mol',
        lastFive,
        `${lastFiveStrongest} to ${lastFiveWeakest}`,
        advice(lastFive >= lastFiveStrongest && lastFive <= lastFiveWeakest),
        name,
      ),
      check(
        'three-prime-strong',
        'G and C in the last five bases',
        strong,
        `at most ${strongInLastFive}`,
        advice(strong <= strongInLastFive),
        name,
      ),
    ],
  };
}

/** Other places where the 3′ end could bind. */
export function checkMispriming(primer: Primer): Check {
  const count = primer.misprimingSites.length;
  return check('mispriming', 'Second places for the 3′ end', count, 'none', advice(count === 0), primer.name);
}

/** Index of the 3′ base on the strand as given, before wrapping round a circle. */
export function threePrimeIndex(start: number, length: number, strand: Strand): number {
  return strand === '+' ? start + length - 1 : start;
}
