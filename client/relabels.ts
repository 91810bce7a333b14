import type { Fact } from './facts';

/** Whether a fact may change how these residues are written: their organism, their numbering or the preferred one. */
export function relabels(
  fact: Fact,
  labels: Iterable<{ proteinId: string; familyId: string } | null>,
): boolean {
  if (fact.kind !== 'protein.changed' && fact.kind !== 'family.changed') return false;
  for (const label of labels) {
    if (label === null) continue;
    if (
      fact.kind === 'protein.changed'
        ? label.proteinId === fact.payload.id
        : label.familyId === fact.payload.id
    )
      return true;
  }
  return false;
}
