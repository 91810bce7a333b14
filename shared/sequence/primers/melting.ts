import type { Issue, ParseResult } from '../parse-result';
import { duplexEnergy, type DuplexFailure } from './duplex-energy';
import {
  DEFAULT_MELTING_CONDITIONS,
  monovalentMillimolar,
  sodiumEquivalentMillimolar,
  type MeltingConditions,
} from './melting-conditions';
import {
  entropySaltCorrection,
  freeMagnesiumMolar,
  inverseDivalentCorrection,
  inverseMonovalentCorrection,
} from './salt-correction';

export interface Melting {
  celsius: number;
  enthalpyKcalPerMol: number;
  /** 1 M NaCl. */
  entropyCalPerMolKelvin: number;
  selfComplementary: boolean;
}

const GAS_CONSTANT_CAL = 1.987;
const ZERO_CELSIUS_KELVIN = 273.15;
/** Lengths for which two states are a fair picture [handbook of the field]. */
export const MEANINGFUL_BASES = { shortest: 10, longest: 60 };

function failure(result: DuplexFailure, bases: string): Issue {
  const issue = (code: string, message: string, column?: number): Issue => ({
    code,
    severity: 'error',
    message,
    ...(column ? { column } : {}),
  });
  switch (result.code) {
    case 'too-short':
      return issue('sequence-too-short', 'A duplex needs at least two bases.');
    case 'not-plain-dna': {
      const at = bases.search(/[^ACGT]/);
      return issue(
        'unknown-base',
        'Only A, C, G and T have nearest-neighbour values.',
        at < 0 ? undefined : at + 1,
      );
    }
    case 'complement-length':
      return issue('complement-length', 'The complement, written 3′→5′, must be as long as the sequence.');
    case 'not-in-table':
      return issue('mismatch-not-in-table', `The table holds no value for ${result.stack}.`, result.at + 1);
  }
}

/** The strand term in mol/L. Equal strands of C_T together are `oligo = template = C_T/2`, which gives C_T/4. */
function strandTermMolar(selfComplementary: boolean, conditions: MeltingConditions): number {
  const { oligoNanomolar, templateNanomolar } = conditions;
  return (selfComplementary ? oligoNanomolar : oligoNanomolar - templateNanomolar / 2) * 1e-9;
}

function conditionIssue(strandMolar: number, conditions: MeltingConditions): Issue | null {
  const error = (code: string, message: string): Issue => ({ code, severity: 'error', message });
  if (!(strandMolar > 0))
    return error(
      'concentration-not-positive',
      'The oligonucleotide must be in excess: oligo − template/2 above zero.',
    );
  const { salt } = conditions;
  if (salt === 'none') return null;
  const enough =
    salt === 'owczarzy-divalent'
      ? monovalentMillimolar(conditions) > 0 || freeMagnesiumMolar(conditions) > 0
      : sodiumEquivalentMillimolar(conditions) > 0;
  return enough
    ? null
    : error('salt-not-positive', 'A salt correction needs some salt; without any take the method "none".');
}

/**
 * Melting temperature of an oligonucleotide (5′→3′, upper case) by nearest neighbours, with its perfect complement or with
 * `complement` written 3′→5′ and holding mismatches: Tm = 1000·ΔH/(ΔS + R ln k) − 273.15, R = 1.987 cal/mol/K, k = oligo − template/2,
 * for a self-complementary strand k = oligo and the symmetry term.
 *
 * Errors: `sequence-too-short`, `unknown-base`, `complement-length`, `mismatch-not-in-table`, `concentration-not-positive`,
 * `salt-not-positive`. Warning: `length-not-meaningful`. Sources: SantaLucia 1998 PNAS 95:1460 and those of the tables.
 */
export function meltingOf(
  bases: string,
  conditions: MeltingConditions = DEFAULT_MELTING_CONDITIONS,
  complement?: string,
): ParseResult<Melting> {
  const duplex = duplexEnergy(bases, conditions.set, complement);
  if ('code' in duplex) return { value: null, issues: [failure(duplex, bases)] };
  const { enthalpyKcalPerMol, entropyCalPerMolKelvin, selfComplementary, gcFraction } = duplex;
  const strandMolar = strandTermMolar(selfComplementary, conditions);
  const problem = conditionIssue(strandMolar, conditions);
  if (problem) return { value: null, issues: [problem] };
  const saltEntropy = conditions.salt === 'santalucia' ? entropySaltCorrection(bases.length, conditions) : 0;
  const entropy = entropyCalPerMolKelvin + saltEntropy + GAS_CONSTANT_CAL * Math.log(strandMolar);
  let inverseKelvin = entropy / (1000 * enthalpyKcalPerMol);
  if (conditions.salt === 'owczarzy-monovalent')
    inverseKelvin += inverseMonovalentCorrection(gcFraction, conditions);
  if (conditions.salt === 'owczarzy-divalent')
    inverseKelvin += inverseDivalentCorrection(bases.length, gcFraction, conditions);
  const celsius = 1 / inverseKelvin - ZERO_CELSIUS_KELVIN;
  if (!Number.isFinite(celsius) || celsius < -ZERO_CELSIUS_KELVIN)
    return {
      value: null,
      issues: [{ code: 'no-duplex', severity: 'error', message: 'These strands form no duplex that melts.' }],
    };
  const { shortest, longest } = MEANINGFUL_BASES;
  const meaningful = bases.length >= shortest && bases.length <= longest;
  const issues: Issue[] = meaningful
    ? []
    : [
        {
          code: 'length-not-meaningful',
          severity: 'warning',
          message: `The method holds for ${shortest} to ${longest} bases; this has ${bases.length}.`,
        },
      ];
  return { value: { celsius, enthalpyKcalPerMol, entropyCalPerMolKelvin, selfComplementary }, issues };
}

/** `meltingOf` as a bare figure; null when it cannot be computed. */
export function meltingCelsius(
  bases: string,
  conditions: MeltingConditions,
  complement?: string,
): number | null {
  return meltingOf(bases, conditions, complement).value?.celsius ?? null;
}
