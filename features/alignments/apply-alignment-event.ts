import type { z } from 'zod';
import type { Alignment, alignments } from '@/shared/contracts/alignments';
import { outOfDate, type Applied, type Fact } from '@/client/facts';
import { keepNewer } from '@/client/keep-newer';

export type AlignmentWithRows = z.infer<typeof alignments.read.reply>;

/** A known alignment is replaced in its place; where a new one stands, the server knows. */
export function applyToAlignments(list: Alignment[], fact: Fact): Applied<Alignment[]> {
  if (fact.kind !== 'alignment.changed') return list;
  const next = fact.payload;
  const old = list.find(({ id }) => id === next.id);
  // One that became the reference took that from another.
  if (!old || (next.version > old.version && next.isReference !== old.isReference)) return outOfDate;
  const kept = keepNewer(old, next);
  return kept === old ? list : list.map((one) => (one === old ? kept : one));
}

/** Rows belong to a revision, which never changes; only the names of organisms in them do. */
export function applyToAlignment(alignment: AlignmentWithRows, fact: Fact): Applied<AlignmentWithRows> {
  if (fact.kind === 'alignment.changed' && fact.payload.id === alignment.id) {
    if (fact.payload.version <= alignment.version) return alignment;
    if (fact.payload.revisionId !== alignment.revisionId) return outOfDate;
    return { ...alignment, ...fact.payload };
  }
  if (fact.kind !== 'protein.changed') return alignment;
  const { id, organism } = fact.payload;
  const isRenamed = alignment.rows.some((row) => row.proteinId === id && row.organism !== organism);
  return isRenamed ? outOfDate : alignment;
}
