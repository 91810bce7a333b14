import {
  monovalentMillimolar,
  sodiumEquivalentMillimolar,
  type MeltingConditions,
} from './melting-conditions';

/** Binding of magnesium by dNTP, L/mol. Source: Owczarzy et al. 2008 Biochemistry 47:5336. */
const DNTP_MAGNESIUM_BINDING = 3e4;

/** Added to the entropy (cal/mol/K) of a duplex of `length` bases. Source: SantaLucia 1998 PNAS 95:1460. */
export function entropySaltCorrection(length: number, conditions: MeltingConditions): number {
  return 0.368 * (length - 1) * Math.log(sodiumEquivalentMillimolar(conditions) / 1000);
}

function monovalentTerm(gcFraction: number, logMonovalent: number): number {
  return (4.29 * gcFraction - 3.95) * 1e-5 * logMonovalent + 9.4e-6 * logMonovalent ** 2;
}

/** Added to 1/Tm (1/K). Source: Owczarzy et al. 2004 Biochemistry 43:3537. */
export function inverseMonovalentCorrection(gcFraction: number, conditions: MeltingConditions): number {
  return monovalentTerm(gcFraction, Math.log(sodiumEquivalentMillimolar(conditions) / 1000));
}

/** Magnesium not held by dNTP, mol/L (Owczarzy 2008). */
export function freeMagnesiumMolar(conditions: MeltingConditions): number {
  const magnesium = conditions.magnesiumMillimolar / 1000;
  const dntp = conditions.dntpMillimolar / 1000;
  if (dntp <= 0) return magnesium;
  const term = DNTP_MAGNESIUM_BINDING * (dntp - magnesium) + 1;
  return (
    (-term + Math.sqrt(term ** 2 + 4 * DNTP_MAGNESIUM_BINDING * magnesium)) / (2 * DNTP_MAGNESIUM_BINDING)
  );
}

/**
 * Added to 1/Tm (1/K) with magnesium. By the ratio √Mg/monovalent: below 0.22 the monovalent formula, below 6 mixed constants,
 * else magnesium alone. Source: Owczarzy et al. 2008 Biochemistry 47:5336.
 */
export function inverseDivalentCorrection(
  length: number,
  gcFraction: number,
  conditions: MeltingConditions,
): number {
  const monovalent = monovalentMillimolar(conditions) / 1000;
  const magnesium = freeMagnesiumMolar(conditions);
  let a = 3.92;
  let d = 1.42;
  let h = 8.31;
  if (monovalent > 0) {
    const ratio = Math.sqrt(magnesium) / monovalent;
    const log = Math.log(monovalent);
    if (ratio < 0.22) return monovalentTerm(gcFraction, log);
    if (ratio < 6) {
      a = 3.92 * (0.843 - 0.352 * Math.sqrt(monovalent) * log);
      d = 1.42 * (1.279 - 4.03e-3 * log - 8.03e-3 * log ** 2);
      h = 8.31 * (0.486 - 0.258 * log + 5.25e-3 * log ** 3);
    }
  }
  const log = Math.log(magnesium);
  const byLength = (-48.2 + 52.5 * log + h * log ** 2) / (2 * (length - 1));
  return (a - 0.911 * log + gcFraction * (6.26 + d * log) + byLength) * 1e-5;
}
