import type { z } from 'zod';
import type { Annotation, AnnotationAtResidue, annotationVersion } from '@/shared/contracts/annotations';
import type { ResidueRef } from '@/shared/contracts/common';
import { outOfDate, type Applied, type Fact } from '@/client/facts';
import { byText, putNewer } from '@/client/keep-newer';
import { relabels } from '@/client/relabels';

export type AnnotationVersion = z.infer<typeof annotationVersion>;

/** Those pinned here first, then those on equivalent residues, newest first. */
function inOrder(one: AnnotationAtResidue, other: AnnotationAtResidue): number {
  const isVia = ({ viaEquivalence }: AnnotationAtResidue) => Number(viaEquivalence !== null);
  return isVia(one) - isVia(other) || byText(other.id, one.id);
}

/** The annotations that hold at one residue. */
export function applyToAnnotationsAtResidue(
  list: AnnotationAtResidue[],
  fact: Fact,
  here: ResidueRef,
): Applied<AnnotationAtResidue[]> {
  if (fact.kind === 'annotation.changed') return withAnnotation(list, fact.payload, here);
  // Which residues are equivalent may have changed.
  if (fact.kind === 'alignment.changed') return outOfDate;
  if (fact.kind === 'family.changed' && list.length === 0) return outOfDate;
  const labels = list.flatMap(({ pins, viaEquivalence }) => [...pins, viaEquivalence?.residue ?? null]);
  return relabels(fact, labels) ? outOfDate : list;
}

function withAnnotation(
  list: AnnotationAtResidue[],
  next: Annotation,
  here: ResidueRef,
): Applied<AnnotationAtResidue[]> {
  const old = list.find(({ id }) => id === next.id);
  if (old) return putNewer(list, { ...next, viaEquivalence: old.viaEquivalence }, inOrder);
  const isHere = next.pins.some(
    (pin) => pin.proteinId === here.proteinId && pin.residueIndex === here.residueIndex,
  );
  if (isHere) return putNewer(list, { ...next, viaEquivalence: null }, inOrder);
  // A new one may be pinned on an equivalent residue; pins never move, so an older one was looked at before.
  return next.version === 1 ? outOfDate : list;
}

/** All versions of one annotation, newest first. Accepting or contesting makes no new one. */
export function applyToAnnotationVersions(
  list: AnnotationVersion[],
  fact: Fact,
  annotationId: string,
): AnnotationVersion[] {
  if (fact.kind !== 'annotation.changed' || fact.payload.id !== annotationId) return list;
  const { versionNumber, kind, text, confidence, evidence, changedBy, changedAt } = fact.payload;
  if (list.some(({ number }) => number >= versionNumber)) return list;
  return [{ number: versionNumber, kind, text, confidence, evidence, by: changedBy, at: changedAt }, ...list];
}
