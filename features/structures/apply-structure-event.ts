import type { ChainMap } from '@/shared/contracts/maps';
import type { Structure, StructureWithChains } from '@/shared/contracts/structures';
import { outOfDate, type Applied, type Fact } from '@/client/facts';
import { keepNewer, keepNotOlder, newestFirst, putNewer } from '@/client/keep-newer';

/** Newest first. How many of its chains wait changes with each decision, without a version of its own. */
export function applyToStructures(list: Structure[], fact: Fact): Structure[] {
  if (fact.kind !== 'structure.changed') return list;
  return putNewer(list, fact.payload, newestFirst, keepNotOlder);
}

/** Chains belong to a revision; what a curator said of one is its map. */
export function applyToStructure(structure: StructureWithChains, fact: Fact): Applied<StructureWithChains> {
  if (fact.kind === 'map.decided' && fact.payload.structureId === structure.id) {
    return withMap(structure, fact.payload);
  }
  if (fact.kind === 'structure.changed' && fact.payload.id === structure.id) {
    if (fact.payload.version < structure.version) return structure;
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
