import { compareLetters } from '../alphabet';
import { chainIndex, residueIndex } from '../positions';
import { pairsInEveryOptimal } from './ambiguous-pairs';
import { breaksOfChain } from './chain-breaks';
import type { CandidateProtein, ChainMap, MappableChain, MapSegment } from './chain-types';
import { exceptionsOf } from './map-exceptions';
import {
  alignPairWithPaths,
  DEFAULT_GAP_RULES,
  fitsInMemory,
  type GapRules,
  type PairSegment,
} from './pairwise';
import { releaseTagEnds, type Partners } from './tag-ends';

/** Optimal pairs of an observed sequence and a protein, before a particular chain's own facts are looked at. */
export interface ChainAlignment {
  score: number;
  pairs: PairSegment[];
  sure: Int32Array;
  /** Breaks of the chain, as `breaksOfChain` gives them. */
  breaks: readonly number[];
}

/** Letters of the residues seen, in file order. */
export function observedLetters(chain: MappableChain): string {
  return chain.residues.map((residue) => residue.letter).join('');
}

/** Aligns the letters seen with a protein, gaps at the chain's breaks when that costs nothing. Null: too long. */
export function alignChain(
  observed: string,
  breaks: readonly number[],
  protein: string,
  rules: GapRules = DEFAULT_GAP_RULES,
): ChainAlignment | null {
  if (!fitsInMemory(observed.length, protein.length)) return null;
  const { alignment, paths } = alignPairWithPaths(observed, protein, { ...rules, breaksInA: breaks });
  return { score: alignment.score, pairs: alignment.segments, sure: pairsInEveryOptimal(paths), breaks };
}

function partnersOf(pairs: readonly PairSegment[], observedLength: number): Partners {
  const partners = new Int32Array(observedLength).fill(-1);
  for (const { aStart, bStart, length } of pairs)
    for (let k = 0; k < length; k += 1) partners[aStart + k] = bStart + k;
  return partners;
}

function segmentsOf(partners: Partners, breaks: ReadonlySet<number>): MapSegment[] {
  const segments: MapSegment[] = [];
  let open: MapSegment | null = null;
  partners.forEach((partner, index) => {
    if (partner === -1) {
      open = null;
      return;
    }
    if (open !== null && open.proteinStart + open.length === partner && !breaks.has(index)) open.length += 1;
    else {
      open = { chainStart: chainIndex(index), proteinStart: residueIndex(partner), length: 1 };
      segments.push(open);
    }
  });
  return segments;
}

/**
 * The map that follows from an alignment: segments that end at every gap and every unobserved stretch, tags
 * released from the protein's ends, and every residue that is not a plain match. Indices from 0.
 */
export function describeMap(
  chain: MappableChain,
  protein: CandidateProtein,
  alignment: ChainAlignment,
): ChainMap {
  const partners = partnersOf(alignment.pairs, chain.residues.length);
  releaseTagEnds(partners, chain, protein.residues);
  let aligned = 0;
  let determined = 0;
  let identical = 0;
  partners.forEach((partner, index) => {
    if (partner === -1) return;
    aligned += 1;
    const relation = compareLetters(chain.residues[index]?.letter ?? 'X', protein.residues.charAt(partner));
    if (relation !== 'undetermined') determined += 1;
    if (relation === 'identical') identical += 1;
  });
  return {
    proteinId: protein.id,
    score: alignment.score,
    identical,
    determined,
    aligned,
    identity: determined === 0 ? 0 : identical / determined,
    coverage: chain.residues.length === 0 ? 0 : aligned / chain.residues.length,
    segments: segmentsOf(partners, new Set(alignment.breaks)),
    exceptions: exceptionsOf(chain, protein.residues, partners, alignment.sure),
  };
}

/** One chain on one given protein, without thresholds; null when the two are too long to align. */
export function mapChainTo(
  chain: MappableChain,
  protein: CandidateProtein,
  rules: GapRules = DEFAULT_GAP_RULES,
): ChainMap | null {
  const alignment = alignChain(
    observedLetters(chain),
    breaksOfChain(chain.residues),
    protein.residues,
    rules,
  );
  return alignment === null ? null : describeMap(chain, protein, alignment);
}
