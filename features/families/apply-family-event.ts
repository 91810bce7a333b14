import type { Family, Protein, ProteinBrief } from '@/shared/contracts/families';
import { outOfDate, type Applied, type Fact } from '@/client/facts';
import { byText, keepNewer, keepNotOlder, putNewer } from '@/client/keep-newer';

export function applyToFamilies(list: Family[], fact: Fact): Applied<Family[]> {
  if (fact.kind === 'family.changed') {
    const inOrder = (one: Family, other: Family) => one.sort - other.sort || byText(one.id, other.id);
    return putNewer(list, fact.payload, inOrder, keepNotOlder);
  }
  // These can bring new proteins, which a family counts.
  const brings =
    fact.kind === 'alignment.changed' ||
    fact.kind === 'map.decided' ||
    (fact.kind === 'protein.changed' && fact.payload.version === 1);
  return brings ? outOfDate : list;
}

/** The proteins of one family, oldest first. */
export function applyToProteins(list: ProteinBrief[], fact: Fact, familyId: string): Applied<ProteinBrief[]> {
  if (fact.kind === 'protein.changed' && fact.payload.familyId === familyId) {
    const { id, organism, name, length, version } = fact.payload;
    const brief = { id, familyId, organism, name, length, version };
    return putNewer(list, brief, (one, other) => byText(one.id, other.id));
  }
  const { kind, payload } = fact;
  if (kind === 'alignment.changed' && payload.familyId === familyId) return outOfDate;
  const hasNew =
    kind === 'map.decided' &&
    payload.familyId === familyId &&
    payload.proteinId !== null &&
    !list.some(({ id }) => id === payload.proteinId);
  return hasNew ? outOfDate : list;
}

export function applyToProtein(protein: Protein, fact: Fact): Applied<Protein> {
  if (fact.kind === 'protein.changed' && fact.payload.id === protein.id)
    return keepNewer(protein, fact.payload);
  // The preferred numbering is the family's.
  return fact.kind === 'family.changed' && fact.payload.id === protein.familyId ? outOfDate : protein;
}
