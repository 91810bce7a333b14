import type { ChainMap } from '@/shared/contracts/maps';
import { countWords } from '@/components/ui/count-words';

/** `98.7 %`, kept on one line; what is not whole never reads as 100. */
export function percentWords(fraction: number): string {
  const rounded = Math.round(fraction * 1000) / 10;
  return `${fraction < 1 ? Math.min(99.9, rounded) : rounded}\u00a0%`;
}

/** How author numbers relate to places in the sequence, seen at both ends of the chain; null when it isn't one shift. */
export function authorShift({
  segments,
  observedLength,
  firstLabel,
  lastLabel,
}: Pick<ChainMap, 'segments' | 'observedLength' | 'firstLabel' | 'lastLabel'>): number | null {
  const first = segments[0];
  const last = segments.at(-1);
  if (!first || !last || first.chainStart !== 0 || last.chainStart + last.length !== observedLength)
    return null;
  if (!/^-?\d+$/.test(firstLabel) || !/^-?\d+$/.test(lastLabel)) return null;
  const atFirst = Number(firstLabel) - (first.proteinStart + 1);
  const atLast = Number(lastLabel) - (last.proteinStart + last.length);
  return atFirst === atLast ? atFirst : null;
}

/** The same in words. */
export function shiftWords(shift: number): string {
  if (shift === 0) return 'equals the place in the sequence';
  return `place in the sequence ${shift > 0 ? 'plus' : 'minus'} ${Math.abs(shift)}`;
}

/** The stretch of the protein a chain lies on, places from 1, with its gaps: `2 to 79 of 81, 1 gap`. */
export function stretchWords(segments: ChainMap['segments'], proteinLength: number | null): string {
  const first = segments[0];
  const last = segments.at(-1);
  if (!first || !last || proteinLength === null) return 'nothing';
  const ends = `${first.proteinStart + 1} to ${last.proteinStart + last.length} of ${proteinLength}`;
  const gaps = segments.filter((segment, at) => {
    const before = segments[at - 1];
    return before !== undefined && before.proteinStart + before.length < segment.proteinStart;
  }).length;
  return gaps === 0 ? ends : `${ends}, ${countWords(gaps, 'gap')}`;
}
