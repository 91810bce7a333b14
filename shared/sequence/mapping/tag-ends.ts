import { compareLetters } from '../alphabet';
import type { MappableChain } from './chain-types';

/** Longest run of mismatches at an end that is taken for the end of a tag (handbook rule of the field, a choice). */
export const MAX_TAG_MISMATCHES = 3;
/** Below this identity a chain is not on its own protein, and mismatches at its ends say nothing about tags. */
export const MIN_IDENTITY_FOR_TAG_RULE = 0.9;
/** A run that marks a purification tag by itself. */
const HISTIDINE_RUN = /H{6,}/;

/** Pairs as partner lists: index = chain residue, value = protein residue or −1. */
export type Partners = Int32Array;

const saysTag = (comment: string) => /TAG|CLONING|LEADER|INITIATING/i.test(comment);

/**
 * Alignments with free ends pair the last residue of a tag with the first of the protein that the tag
 * replaced. A run of up to three mismatches at the outermost pairs, with unpaired chain residues beyond, is
 * unpaired here: it is the tag, unless the file calls the residue something else (an engineered one, say).
 */
export function releaseTagEnds(partners: Partners, chain: MappableChain, protein: string): void {
  const comments = new Map(chain.differences.map((difference) => [difference.label, difference.comment]));
  const paired = [...partners.keys()].filter((index) => partners[index] !== -1);
  const agrees = (index: number) => {
    const partner = partners[index] ?? -1;
    return compareLetters(chain.residues[index]?.letter ?? 'X', protein.charAt(partner)) === 'identical';
  };
  const identical = paired.filter(agrees).length;
  if (identical < paired.length * MIN_IDENTITY_FOR_TAG_RULE) return;
  const release = (inward: readonly number[], overhang: boolean) => {
    if (!overhang) return;
    const run = inward.findIndex(agrees);
    if (run < 1 || run > MAX_TAG_MISMATCHES) return;
    const ends = inward.slice(0, run);
    const comment = (index: number) => comments.get(chain.residues[index]?.label ?? '');
    if (ends.some((index) => comment(index) !== undefined && !saysTag(comment(index) ?? ''))) return;
    for (const index of ends) partners[index] = -1;
  };
  release(paired, (paired[0] ?? 0) > 0);
  release([...paired].reverse(), (paired.at(-1) ?? chain.residues.length) < chain.residues.length - 1);
}

/** How many residues of an overhang are a tag by evidence: the file says so, or it holds six histidines in a row. */
export function provenTagLength(chain: MappableChain, indices: readonly number[]): number {
  const comments = new Map(chain.differences.map((difference) => [difference.label, difference.comment]));
  const letters = indices.map((index) => chain.residues[index]?.letter ?? 'X').join('');
  if (HISTIDINE_RUN.test(letters)) return indices.length;
  return indices.filter((index) => saysTag(comments.get(chain.residues[index]?.label ?? '') ?? '')).length;
}
