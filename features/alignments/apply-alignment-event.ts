import type { z } from 'zod';
import type { Alignment, alignments } from '@/shared/contracts/alignments';
import { outOfDate, type Applied, type Fact } from '@/client/facts';
import { newestFirst, putNewer } from '@/client/keep-newer';

export type AlignmentWithRows = z.infer<typeof alignments.read.reply>;

/** Newest first. Which one is the reference is the family's to say. */
export function applyToAlignments(list: Alignment[], fact: Fact): Applied<Alignment[]> {
  if (fact.kind === 'family.changed') {
    const { id, referenceAlignmentId } = fact.payload;
    const isWrong = (one: Alignment) => one.isReference !== (one.id === referenceAlignmentId);
    return list.some((one) => one.familyId === id && isWrong(one)) ? outOfDate : list;
  }
  return fact.kind === 'alignment.changed' ? putNewer(list, fact.payload, newestFirst) : list;
}

/** Rows belong to a revision, which never changes; only the names of organisms in them do. */
export function applyToAlignment(alignment: AlignmentWithRows, fact: Fact): Applied<AlignmentWithRows> {
  if (fact.kind === 'alignment.changed' && fact.payload.id === alignment.id) {
    if (fact.payload.version <= alignment.version) return alignment;
    if (fact.payload.revisionId !== alignment.revisionId) return outOfDate;
    return { ...alignment, ...fact.payload };
  }
  if (fact.kind === 'family.changed' && fact.payload.id === alignment.familyId) {
    const isReference = fact.payload.referenceAlignmentId === alignment.id;
    return isReference === alignment.isReference ? alignment : outOfDate;
  }
  if (fact.kind !== 'protein.changed') return alignment;
  const { id, organism } = fact.payload;
  const isRenamed = alignment.rows.some((row) => row.proteinId === id && row.organism !== organism);
  return isRenamed ? outOfDate : alignment;
}
