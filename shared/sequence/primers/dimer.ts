import { complement } from '../construct/bases';
import {
  END_ENERGY_KCAL,
  HAIRPIN_LOOP_KCAL,
  STACK_ENERGY_KCAL,
  TRILOOP_AT_CLOSURE_KCAL,
} from './structure-energy.data';

/** The most stable ungapped pairing of two strands; energies in kcal/mol at 37 °C, 1 M salt; 0 when none is stable. */
export interface Dimer {
  kcalPerMol: number;
  /** Paired bases of the first strand, 5′→3′. */
  segment: string;
  /** Index of the first of them, from 0. */
  start: number;
  /** The 3′ end of either strand is paired. */
  threePrimePaired: boolean;
}

export interface DimerResult {
  best: Dimer | null;
  /** The best that holds a 3′ end, which a polymerase would lengthen. */
  bestAtThreePrime: Dimer | null;
}

export interface Hairpin {
  kcalPerMol: number;
  /** 5′ half of the stem and the loop, 5′→3′. */
  stem: string;
  loop: string;
  /** Index of the first and last base, from 0. */
  start: number;
  end: number;
  threePrimePaired: boolean;
}

const MINIMUM_RUN = 2;
const MINIMUM_STEM = 3;
const MINIMUM_LOOP = 3;
/** cal → kcal, 37 °C in kelvin. */
const GAS_CONSTANT_KCAL = 1.987e-3;
const BODY_KELVIN = 310.15;

const stack = (first: string, second: string) => STACK_ENERGY_KCAL[first + second] ?? 0;
const endTerm = (base: string) => (base === 'G' || base === 'C' ? END_ENERGY_KCAL.GC : END_ENERGY_KCAL.AT);

/** Sum of the stacks of a strand with its perfect complement, kcal/mol at 37 °C, 1 M salt. */
export function stackSumKcalPerMol(bases: string): number {
  let sum = 0;
  for (let index = 0; index + 1 < bases.length; index += 1)
    sum += stack(bases.charAt(index), bases.charAt(index + 1));
  return sum;
}

/**
 * Best pairing of two strands (both 5′→3′): one slides over the reverse of the other, each run of at least two pairs without gap or
 * mismatch counts Σ stacks + one end term for each end. Source of the energies: SantaLucia 1998 PNAS 95:1460.
 */
export function findDimer(first: string, second: string): DimerResult {
  const result: DimerResult = { best: null, bestAtThreePrime: null };
  const partner = complement(second);
  const keep = (from: number, to: number, sum: number, offset: number): void => {
    if (to - from + 1 < MINIMUM_RUN) return;
    const kcalPerMol = sum + endTerm(first.charAt(from)) + endTerm(first.charAt(to));
    const threePrimePaired = to === first.length - 1 || offset - from === second.length - 1;
    const dimer = { kcalPerMol, segment: first.slice(from, to + 1), start: from, threePrimePaired };
    if (kcalPerMol < (result.best?.kcalPerMol ?? 0)) result.best = dimer;
    if (threePrimePaired && kcalPerMol < (result.bestAtThreePrime?.kcalPerMol ?? 0))
      result.bestAtThreePrime = dimer;
  };
  // Base i of the first strand lies over base (offset − i) of the second.
  for (let offset = 0; offset <= first.length + second.length - 2; offset += 1) {
    const low = Math.max(0, offset - second.length + 1);
    const high = Math.min(first.length - 1, offset);
    let from = -1;
    let sum = 0;
    for (let index = low; index <= high; index += 1) {
      const pairs = first.charAt(index) === partner.charAt(offset - index);
      if (pairs && from >= 0) sum += stack(first.charAt(index - 1), first.charAt(index));
      else if (pairs) {
        from = index;
        sum = 0;
      } else if (from >= 0) {
        keep(from, index - 1, sum, offset);
        from = -1;
      }
    }
    if (from >= 0) keep(from, high, sum, offset);
  }
  return result;
}

export function findSelfDimer(bases: string): DimerResult {
  return findDimer(bases, bases);
}

/** Initiation of a loop; lengths the table lacks are extrapolated from the next shorter one. */
function loopEnergy(length: number): number {
  let known = HAIRPIN_LOOP_KCAL[0] ?? [MINIMUM_LOOP, 0];
  for (const entry of HAIRPIN_LOOP_KCAL) if (entry[0] <= length) known = entry;
  const [size, kcal] = known;
  return size === length ? kcal : kcal + 2.44 * GAS_CONSTANT_KCAL * BODY_KELVIN * Math.log(length / size);
}

/**
 * Best hairpin: a stem of at least three pairs without bulge or mismatch around a loop of at least three. ΔG = Σ stacks + loop
 * (+0.5 for a loop of three closed by A·T). Null when none is stable. Source: SantaLucia & Hicks 2004 Annu Rev Biophys 33:415.
 */
export function findHairpin(bases: string): Hairpin | null {
  const partner = complement(bases);
  let best: Hairpin | null = null;
  for (let inner = MINIMUM_STEM - 1; inner < bases.length; inner += 1)
    for (let close = inner + MINIMUM_LOOP + 1; close < bases.length; close += 1) {
      let pairs = 0;
      let sum = 0;
      while (
        inner - pairs >= 0 &&
        close + pairs < bases.length &&
        bases[inner - pairs] === partner[close + pairs]
      ) {
        if (pairs > 0) sum += stack(bases.charAt(inner - pairs), bases.charAt(inner - pairs + 1));
        pairs += 1;
      }
      if (pairs < MINIMUM_STEM) continue;
      const loop = bases.slice(inner + 1, close);
      const weakClosure = loop.length === 3 && 'AT'.includes(bases.charAt(inner));
      const kcalPerMol = sum + loopEnergy(loop.length) + (weakClosure ? TRILOOP_AT_CLOSURE_KCAL : 0);
      if (kcalPerMol >= (best?.kcalPerMol ?? 0)) continue;
      const start = inner - pairs + 1;
      const end = close + pairs - 1;
      best = {
        kcalPerMol,
        stem: bases.slice(start, inner + 1),
        loop,
        start,
        end,
        threePrimePaired: end === bases.length - 1,
      };
    }
  return best;
}
