import type { Annotation } from '@/shared/contracts/annotations';
import type { AnnotationValues } from './annotation-values';
import { joinTexts } from './join-texts';

type Content = Pick<AnnotationValues, 'kind' | 'text' | 'confidence' | 'evidence'>;
const keyOf = (one: Content['evidence'][number]): string => `${one.kind}\n${one.reference}`;

/** Mine where I changed it, else theirs. */
const changed = <Value>(base: Value, mine: Value, theirs: Value): Value => (mine === base ? theirs : mine);

/** Evidence that either added stays; what either removed of the common ones goes. */
function joinEvidence(base: Content, mine: Content, theirs: Content): Content['evidence'] {
  const was = new Set(base.evidence.map(keyOf));
  const own = new Set(mine.evidence.map(keyOf));
  const other = new Set(theirs.evidence.map(keyOf));
  const all = [...theirs.evidence, ...mine.evidence.filter((one) => !other.has(keyOf(one)))];
  return all.filter((one) => !was.has(keyOf(one)) || (own.has(keyOf(one)) && other.has(keyOf(one))));
}

/** Joins two edits of one statement that come from the same version. */
export function joinContent(
  base: Annotation,
  mine: AnnotationValues,
  theirs: Annotation,
): { values: AnnotationValues; bothChanged: number } {
  const { text, bothChanged } = joinTexts(base.text, mine.text, theirs.text);
  return {
    values: {
      kind: changed(base.kind, mine.kind, theirs.kind),
      confidence: changed(base.confidence, mine.confidence, theirs.confidence),
      evidence: joinEvidence(base, mine, theirs),
      text,
      partner: null,
    },
    bothChanged,
  };
}
