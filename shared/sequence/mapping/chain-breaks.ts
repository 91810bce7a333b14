import { readLabel } from '../numbering/label-text';
import type { MappableResidue } from './chain-types';

/**
 * Places where a chain lacks residues: k stands for "between residue k − 1 and residue k", from 0.
 * Known from the declared sequence where both neighbours are placed in it, else from a jump in author numbers.
 */
export function breaksOfChain(residues: readonly MappableResidue[]): number[] {
  const breaks: number[] = [];
  for (let index = 1; index < residues.length; index += 1) {
    const before = residues[index - 1];
    const here = residues[index];
    if (before === undefined || here === undefined) continue;
    if (before.declaredIndex !== undefined && here.declaredIndex !== undefined) {
      if (here.declaredIndex !== before.declaredIndex + 1) breaks.push(index);
      continue;
    }
    const numberBefore = readLabel(before.label)?.number ?? 0;
    const numberHere = readLabel(here.label)?.number ?? 0;
    if (numberHere > numberBefore + 1) breaks.push(index);
  }
  return breaks;
}
