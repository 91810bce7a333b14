import type { CandidateProtein, MappableChain } from '../../../shared/sequence/mapping/chain-types';
import type { NewMap } from './map.adding';

/** A chain beside a protein that a person chose. */
export type MappedChain = Pick<NewMap, 'segments' | 'exceptions' | 'readiness'> & {
  identity: number;
  coverage: number;
};
/** Aligns one chain with one protein, wherever that is done; null when the two are too long to be aligned. */
export type ChainMapper = (chain: MappableChain, protein: CandidateProtein) => Promise<MappedChain | null>;
