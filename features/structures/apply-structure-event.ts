import type { ChainMap } from '@/shared/contracts/maps';
import type { Structure, StructureWithChains } from '@/shared/contracts/structures';
import { outOfDate, type Applied, type Fact } from '@/client/facts';
import { keepNewer } from '@/client/keep-newer';

/** A known structure is replaced in its place; where a new one stands, and how many chains wait, the server knows. */
export function applyToStructures(list: Structure[], fact: Fact): Applied<Structure[]> {
  if (fact.kind === 'map.decided') {
    return list.some(({ id }) => id === fact.payload.structureId) ? outOfDate : list;
  }
  if (fact.kind !== 'structure.changed') return list;
  const old = list.find(({ id }) => id === fact.payload.id);
  if (!old) return outOfDate;
  const kept = keepNewer(old, fact.payload);
  return kept === old ? list : list.map((one) => (one === old ? kept : one));
}

/** Chains belong to a revision; what a curator said of one is its map. */
export function applyToStructure(structure: StructureWithChains, fact: Fact): Applied<StructureWithChains> {
  if (fact.kind === 'map.decided' && fact.payload.structureId === structure.id) {
    return withMap(structure, fact.payload);
  }
  if (fact.kind === 'structure.changed' && fact.payload.id === structure.id) {
    if (fact.payload.version <= structure.version) return structure;
    return fact.payload.revisionId === structure.revisionId ? { ...structure, ...fact.payload } : outOfDate;
  }
  return namesProtein(structure.chains, fact) ? outOfDate : structure;
}

function withMap(structure: StructureWithChains, map: ChainMap): Applied<StructureWithChains> {
  const old = structure.chains.find(({ chainId }) => chainId === map.chainId);
  if (!old) return outOfDate;
  if (keepNewer(old, map) === old) return structure;
  const chains = structure.chains.map((chain) => (chain === old ? map : chain));
  return { ...structure, chains, waiting: chains.filter(({ status }) => status === 'proposed').length };
}

/** Chains and what they might be are written with the names of organisms and families. */
function namesProtein(chains: readonly ChainMap[], fact: Fact): boolean {
  if (fact.kind === 'protein.changed') {
    const { id, version } = fact.payload;
    const isNamed = ({ proteinId, candidates }: ChainMap) =>
      proteinId === id || candidates.some((candidate) => candidate.proteinId === id);
    return version > 1 && chains.some(isNamed);
  }
  if (fact.kind !== 'family.changed') return false;
  const { id } = fact.payload;
  return chains.some(
    (chain) => chain.familyId === id || chain.candidates.some(({ familyId }) => familyId === id),
  );
}
