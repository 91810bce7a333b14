import { countWords } from '@/components/ui/count-words';
import { mismatchCount, percentWords, runnerUp, type ChainGroup } from '@/features/maps';
import type { ChainMap } from '@/shared/contracts/maps';

const letters = (chain: ChainMap): string => countWords(chain.observedLength, 'residue');

/** How a chain compares, in one sentence for a row. */
export function chainSentence({ first, standing }: ChainGroup): string {
  if (standing === 'no protein') return `${first.reason} ${letters(first)}.`;
  if (first.identity === null || first.coverage === null) return first.reason;
  const mismatches = countWords(mismatchCount(first), 'mismatch', 'mismatches');
  return `${percentWords(first.identity)} identical, ${percentWords(first.coverage)} covered, ${mismatches}; ${runnerUpName(first)} ${runnerUpWords(first)}.`;
}

/** Where nothing is proposed, what is nearest is no runner-up. */
export const runnerUpName = ({ proteinId }: ChainMap): string =>
  proteinId === null ? 'nearest' : 'runner-up';

/** `β 24 %`, with the organism where the family alone would not tell which. */
export function runnerUpWords(chain: ChainMap): string {
  const next = runnerUp(chain);
  if (!next) return 'none near';
  const of = chain.proteinId === null || next.familyId === chain.familyId ? ` ${next.organism}` : '';
  return `${next.family}${of} ${percentWords(next.identity)}`;
}

/** `Chain A`, `Chains A to I`. */
export const groupTitle = ({ chains, names }: ChainGroup): string =>
  `${chains.length === 1 ? 'Chain' : 'Chains'} ${names}`;
