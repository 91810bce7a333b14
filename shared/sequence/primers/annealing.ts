import { complement } from '../construct/bases';
import { meltingCelsius } from './melting';
import type { MeltingConditions } from './melting-conditions';
import type { Primer } from './types';

/**
 * Melting of a primer (5′→3′) on the strand it first binds (written 3′→5′ under it): with its mismatches where the table has them,
 * or else of the more stable of the two arms that fit.
 */
export function annealTo(
  bases: string,
  template: string,
  conditions: MeltingConditions,
): { celsius: number | null; basis: Primer['annealingBasis'] } {
  const whole = meltingCelsius(bases, conditions, template);
  if (whole !== null) return { celsius: whole, basis: 'whole-with-mismatch' };
  const fitting = complement(bases);
  let head = 0;
  while (head < bases.length && fitting[head] === template[head]) head += 1;
  let tail = 0;
  while (tail < bases.length - head && fitting[bases.length - 1 - tail] === template[bases.length - 1 - tail])
    tail += 1;
  const arms = [bases.slice(0, head), bases.slice(bases.length - tail)].map((arm) =>
    meltingCelsius(arm, conditions, complement(arm)),
  );
  const known = arms.filter((celsius) => celsius !== null);
  return { celsius: known.length === 0 ? null : Math.max(...known), basis: 'matched-arm' };
}
