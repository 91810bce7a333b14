import { complement, isPlainDna, reverseComplement } from '../construct/bases';
import { gcFraction } from './gc';
import type { NearestNeighbourSetName } from './melting-conditions';
import {
  INTERNAL_MISMATCH,
  REVISED_2004,
  SUGIMOTO_1996,
  UNIFIED_1998,
  type EnthalpyEntropy,
  type NearestNeighbourSet,
} from './nearest-neighbour.data';

const SETS: Record<NearestNeighbourSetName, NearestNeighbourSet> = {
  unified: UNIFIED_1998,
  revised2004: REVISED_2004,
  sugimoto1996: SUGIMOTO_1996,
};

export interface DuplexEnergy {
  enthalpyKcalPerMol: number;
  /** 1 M NaCl. */
  entropyCalPerMolKelvin: number;
  selfComplementary: boolean;
  gcFraction: number;
}

export type DuplexFailure =
  | { code: 'too-short' | 'not-plain-dna' | 'complement-length' }
  | { code: 'not-in-table'; stack: string; at: number };

function reversed(text: string): string {
  return [...text].reverse().join('');
}

/** Stacks of each set by the two bases of one strand, the other being its complement. */
const perfectStacks = Object.fromEntries(
  Object.entries(SETS).map(([name, set]) => {
    const stacks = new Map<string, EnthalpyEntropy>();
    for (const first of 'ACGT')
      for (const second of 'ACGT') {
        const key = `${first}${second}/${complement(first + second)}`;
        const value = set.pairs[key] ?? set.pairs[reversed(key)];
        if (value) stacks.set(first + second, value);
      }
    return [name, stacks];
  }),
);

function mismatchedStack(upper: string, lower: string): EnthalpyEntropy | undefined {
  const key = `${upper}/${lower}`;
  return INTERNAL_MISMATCH[key] ?? INTERNAL_MISMATCH[reversed(key)];
}

/**
 * ΔH and ΔS of a duplex at 1 M NaCl by nearest neighbours. `lower` is the other strand written 3′→5′ under `upper` (5′→3′), of the
 * same length; left out it is the perfect complement, and a strand that is its own reverse complement pairs with itself (a partner
 * that is given is taken as another strand). Mismatches inside are looked up; those at an end, and neighbours the table
 * does not hold, are `not-in-table`.
 */
export function duplexEnergy(
  upper: string,
  setName: NearestNeighbourSetName,
  lower?: string,
): DuplexEnergy | DuplexFailure {
  if (upper.length < 2) return { code: 'too-short' };
  if (!isPlainDna(upper)) return { code: 'not-plain-dna' };
  const partner = complement(upper);
  const under = lower ?? partner;
  if (under.length !== upper.length) return { code: 'complement-length' };
  if (!isPlainDna(under)) return { code: 'not-plain-dna' };
  const set = SETS[setName];
  const stacks = perfectStacks[setName];
  const last = upper.length - 1;
  for (const end of [0, last])
    if (under[end] !== partner[end])
      return { code: 'not-in-table', stack: `${upper[end]}/${under[end]}`, at: end };
  let enthalpy = set.initiation[0];
  let entropy = set.initiation[1];
  for (let index = 0; index < last; index += 1) {
    const pair = upper.slice(index, index + 2);
    const below = under.slice(index, index + 2);
    const perfect = below === partner.slice(index, index + 2);
    const value = perfect ? stacks?.get(pair) : mismatchedStack(pair, below);
    if (!value) return { code: 'not-in-table', stack: `${pair}/${below}`, at: index };
    enthalpy += value[0];
    entropy += value[1];
  }
  for (const end of [upper.charAt(0), upper.charAt(last)]) {
    const value = end === 'G' || end === 'C' ? set.endGC : set.endAT;
    enthalpy += value[0];
    entropy += value[1];
  }
  const selfComplementary = lower === undefined && upper === reverseComplement(upper);
  if (selfComplementary) {
    enthalpy += set.symmetry[0];
    entropy += set.symmetry[1];
  }
  return {
    enthalpyKcalPerMol: enthalpy,
    entropyCalPerMolKelvin: entropy,
    selfComplementary,
    gcFraction: gcFraction(upper),
  };
}
