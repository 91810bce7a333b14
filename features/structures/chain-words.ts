import { countWords, mismatchCount, percentWords, runnerUp, type ChainGroup } from '@/features/maps';
import type { ChainMap } from '@/shared/contracts/maps';

const letters = (chain: ChainMap): string => countWords(chain.observedLength, 'residue');

/** How a chain compares, in one sentence for a row. */
export function chainSentence({ first, standing }: ChainGroup): string {
  if (standing === 'no protein') return `${first.reason} ${letters(first)}.`;
  if (first.identity === null || first.coverage === null) return first.reason;
  const mismatches = countWords(mismatchCount(first), 'mismatch', 'mismatches');
  return `${percentWords(first.identity)} identical, ${percentWords(first.coverage)} covered, ${mismatches}; runner-up ${runnerUpWords(first)}.`;
}

/** `β 24 %`, with the organism where it is of the same family; said to be the nearest where nothing is proposed. */
export function runnerUpWords(chain: ChainMap): string {
  const next = runnerUp(chain);
  if (!next) return 'none near';
  if (chain.proteinId === null)
    return `nearest ${next.family} ${next.organism} ${percentWords(next.identity)}`;
  const of = next.familyId === chain.familyId ? ` ${next.organism}` : '';
  return `${next.family}${of} ${percentWords(next.identity)}`;
}

/** `Chain A`, `Chains A to I`. */
export const groupTitle = ({ chains, names }: ChainGroup): string =>
  `${chains.length === 1 ? 'Chain' : 'Chains'} ${names}`;
