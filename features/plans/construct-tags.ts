import type { Construct } from '@/shared/contracts/plans';
import type { ConstructTag } from '@/shared/sequence/construct/match-protein';
import { KNOWN_TAGS } from '@/shared/sequence/construct/tags.data';

/** Residues that a stored construct adds before and behind its protein. */
export function tagsOfConstruct({
  encoded,
  segments,
}: Pick<Construct, 'encoded' | 'segments'>): ConstructTag[] {
  const first = segments[0];
  const last = segments[segments.length - 1];
  if (!first || !last) return [];
  const ends = [
    { end: 'N' as const, residues: encoded.slice(0, first.codonStart) },
    { end: 'C' as const, residues: encoded.slice(last.codonStart + last.length) },
  ];
  return ends
    .filter(({ residues }) => residues !== '')
    .map(({ end, residues }) => ({
      end,
      residues,
      names: KNOWN_TAGS.filter(({ pattern }) => pattern.test(residues)).map(({ name }) => name),
    }));
}
