import type { ChainMap } from '@/shared/contracts/maps';
import type { Fact } from '@/client/facts';
import { keepNewer } from '@/client/keep-newer';

/** The map of one chain. Within its structure it is taken in by the structure. */
export function applyToMap(map: ChainMap, fact: Fact): ChainMap {
  return fact.kind === 'map.decided' && fact.payload.chainId === map.chainId
    ? keepNewer(map, fact.payload)
    : map;
}
