import type { CandidateProtein, ChainMap, MappableChain } from './chain-types';
import type { ChainMatch } from './match-chains';
import { observedLetters } from './map-chain';
import { provenTagLength } from './tag-ends';

/**
 * When a chain is taken for a protein [common practice, no source; handbook 5.7]. Fractions; identity over
 * determined pairs, coverage over observed residues, tags left out where the file or six histidines prove them.
 */
export const MATCH_THRESHOLDS = {
  certain: { identity: 1, coverage: 0.9 },
  protein: { identity: 0.95, coverage: 0.8 },
  family: { identity: 0.3, coverage: 0.7 },
  /** Down to here a family may be a hint ("twilight zone", Rost 1999 Protein Eng 12:85). */
  hintIdentity: 0.2,
  /** Chance identity is high in short chains: below this many residues a family needs more. */
  shortChain: 60,
  shortFamilyIdentity: 0.5,
  /** Shorter chains are not matched by sequence at all. */
  minResidues: 15,
  /** Identity the best family must have over the next one. */
  familyMargin: 0.1,
  /** Another family counts as a rival only when this part of the chain lies on it. */
  rivalCoverage: 0.5,
  /** Less of a chain on a protein than this is chance: free ends often pair a few residues well. */
  partCoverage: 0.3,
  /** From this part of alanine, glycine and unknown residues on, a chain was traced without its sequence. */
  tracedWithoutSequence: 0.9,
} as const;

export type ProposalReason =
  | 'certain'
  | 'mismatches'
  | 'several-proteins'
  | 'new-or-homolog'
  | 'no-margin'
  | 'hint-only'
  | 'too-little-covered'
  | 'nothing-near'
  | 'too-short'
  | 'no-sequence';

export interface ProteinProposal {
  outcome: 'matched' | 'family-only' | 'unmatched';
  reason: ProposalReason;
  /** The reason as a sentence for people. */
  words: string;
  /** The map on the proposed protein (`matched`), or on the nearest one; null when there is none. */
  best: ChainMap | null;
  /** The proposed family; with `unmatched` at most a hint. */
  family: string | null;
  /** Other proteins that fit exactly as well: a person has to choose. */
  equallyGood: string[];
  /** Best map in another family, with enough of the chain on it to count. */
  rival: ChainMap | null;
}

export const percent = (fraction: number) => `${Math.round(fraction * 1000) / 10} %`;

function coverageWithoutTag(chain: MappableChain, map: ChainMap): number {
  const tag = map.exceptions.filter((exception) => exception.kind === 'tag').map((one) => one.chainIndex);
  const first = map.segments[0]?.chainStart ?? 0;
  const proven = [tag.filter((index) => index < first), tag.filter((index) => index >= first)].reduce(
    (sum, indices) => sum + provenTagLength(chain, indices),
    0,
  );
  const rest = chain.residues.length - proven;
  return rest <= 0 ? 0 : map.aligned / rest;
}

function untraceable(letters: string): boolean {
  const vague = letters.replace(/[^AGX]/g, '').length;
  return letters.length > 0 && vague >= letters.length * MATCH_THRESHOLDS.tracedWithoutSequence;
}

/** What one chain most likely is, from its maps on the candidates; `candidates` name the proteins. */
export function proposeProtein(match: ChainMatch, candidates: readonly CandidateProtein[]): ProteinProposal {
  const t = MATCH_THRESHOLDS;
  const { chain, maps } = match;
  const byId = new Map(candidates.map((candidate) => [candidate.id, candidate]));
  const familyOf = (map: ChainMap) => byId.get(map.proteinId)?.family ?? '';
  const nameOf = (id: string) => byId.get(id)?.name ?? id;
  const best = maps[0] ?? null;
  const none = { outcome: 'unmatched' as const, family: null, equallyGood: [], rival: null };
  const letters = observedLetters(chain);
  if (untraceable(letters) && (best === null || best.identity < 1))
    return {
      ...none,
      best: null,
      reason: 'no-sequence',
      words: 'Traced without its sequence (only Ala, Gly or unknown residues). Give its map by hand.',
    };
  if (letters.length < t.minResidues)
    return {
      ...none,
      best: null,
      reason: 'too-short',
      words: `Only ${letters.length} residues are seen: too few to tell a protein by.`,
    };
  if (best === null || best.determined === 0)
    return { ...none, best: null, reason: 'nothing-near', words: 'There is no protein to compare it with.' };

  const family = familyOf(best);
  const coverage = coverageWithoutTag(chain, best);
  const rivals = maps.filter((map) => familyOf(map) !== family && map.coverage >= t.rivalCoverage);
  const rival = rivals.reduce<ChainMap | null>(
    (top, map) => (top === null || map.identity > top.identity ? map : top),
    null,
  );
  const equallyGood = maps
    .filter((map) => map !== best && map.identity === best.identity && map.aligned === best.aligned)
    .filter((map) => familyOf(map) === family)
    .map((map) => map.proteinId);
  const facts = `${percent(best.identity)} identical over ${percent(coverage)} of the chain`;
  const next =
    rival === null ? 'no other family is near' : `next ${nameOf(rival.proteinId)} ${percent(rival.identity)}`;
  const known = { best, family, equallyGood, rival };
  const reaches = (limit: { identity: number; coverage: number }) =>
    best.identity >= limit.identity && coverage >= limit.coverage;

  const familyIdentity = letters.length < t.shortChain ? t.shortFamilyIdentity : t.family.identity;
  const fitsFamily = reaches({ identity: familyIdentity, coverage: t.family.coverage });

  if (rival !== null && fitsFamily && best.identity - rival.identity < t.familyMargin)
    return {
      ...known,
      outcome: 'unmatched',
      reason: 'no-margin',
      words: `${nameOf(best.proteinId)} (${facts}) and ${nameOf(rival.proteinId)} (${percent(rival.identity)}) are too near each other to choose by sequence.`,
    };
  if (reaches(t.protein) && equallyGood.length > 0)
    return {
      ...known,
      outcome: 'matched',
      reason: 'several-proteins',
      words: `${nameOf(best.proteinId)} and ${equallyGood.map(nameOf).join(', ')} fit equally well: ${facts}. Choose one.`,
    };
  if (reaches(t.certain))
    return {
      ...known,
      outcome: 'matched',
      reason: 'certain',
      words: `${nameOf(best.proteinId)}: ${facts}; ${next}.`,
    };
  if (reaches(t.protein)) {
    const mismatches = best.determined - best.identical;
    const count =
      mismatches === 1 ? 'one mismatch' : mismatches === 0 ? 'no mismatch' : `${mismatches} mismatches`;
    return {
      ...known,
      outcome: 'matched',
      reason: 'mismatches',
      words: `${nameOf(best.proteinId)}: ${facts}, ${count}; ${next}.`,
    };
  }
  if (fitsFamily)
    return {
      ...known,
      outcome: 'family-only',
      reason: 'new-or-homolog',
      words: `Nearest is ${nameOf(best.proteinId)}: ${facts}. The family fits, the protein is not among these: add it as a new protein, or leave the chain out.`,
    };
  if (best.identity >= familyIdentity && coverage >= t.partCoverage)
    return {
      ...known,
      outcome: 'unmatched',
      reason: 'too-little-covered',
      words: `Nearest is ${nameOf(best.proteinId)}, but only ${percent(coverage)} of the chain lie on it (${percent(best.identity)} identical).`,
    };
  if (best.identity >= t.hintIdentity && coverage >= t.family.coverage)
    return {
      ...known,
      outcome: 'unmatched',
      reason: 'hint-only',
      words: `Nearest is ${nameOf(best.proteinId)}: ${facts}, too little to tell a family by sequence alone.`,
    };
  return {
    ...known,
    family: null,
    outcome: 'unmatched',
    reason: 'nothing-near',
    words: `No protein is near: the best, ${nameOf(best.proteinId)}, is ${facts}.`,
  };
}
