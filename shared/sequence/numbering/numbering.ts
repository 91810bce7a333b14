import { IssueList } from '../issue-list';
import type { ParseResult } from '../parse-result';
import { residueIndex, type ResidueIndex } from '../positions';
import { MAX_LABEL_NUMBER, readLabel, writeLabel, type LabelParts } from './label-text';

/** A run of residues whose numbers go up by one; all of them carry the same suffix (mostly none). */
export interface NumberingSegment {
  /** First residue of the run, from 0. */
  residueIndex: ResidueIndex;
  length: number;
  /** Number of that residue as people read it; may be negative or 0. */
  firstNumber: number;
  suffix: string;
}

/** What the residues of one protein are called: segments in residue order. A residue in none has no label. */
export interface Numbering {
  segments: readonly NumberingSegment[];
}

/** `1` … `length`, or from another first number (a row named `name/13-79` begins at 13). */
export function sequenceNumbering(length: number, first = 1): Numbering {
  if (length <= 0) return { segments: [] };
  return { segments: [{ residueIndex: residueIndex(0), length, firstNumber: first, suffix: '' }] };
}

/**
 * Label = place in the sequence (from 1) + offset, e.g. offset −50 makes precursor 51 mature 1.
 * With `skipZero` no residue is called 0: positive labels stay as they are, those before are one lower
 * (… −2, −1, 1, 2 …), as in older numberings of the bovine β subunit.
 */
export function offsetNumbering(
  length: number,
  offset: number,
  options: { skipZero?: boolean } = {},
): Numbering {
  const first = 1 + offset;
  if (options.skipZero !== true || first > 0) return sequenceNumbering(length, first);
  const before = Math.min(length, 1 - first);
  const segments = [...sequenceNumbering(before, first - 1).segments];
  if (length > before)
    segments.push({
      residueIndex: residueIndex(before),
      length: length - before,
      firstNumber: 1,
      suffix: '',
    });
  return { segments };
}

/**
 * A numbering from segments given by a person or a file, sorted by residue.
 * Errors: `numbering-outside` (a run beyond the protein), `numbering-overlap` (a residue in two runs),
 * `label-double` (two residues of one label), `number-unusable` (no whole number, or too large).
 */
export function makeNumbering(
  segments: readonly NumberingSegment[],
  proteinLength: number,
): ParseResult<Numbering> {
  const issues = new IssueList();
  const sorted = [...segments].sort((a, b) => a.residueIndex - b.residueIndex);
  let end = 0;
  for (const segment of sorted) {
    const { residueIndex: start, length, firstNumber, suffix } = segment;
    const last = firstNumber + length - 1;
    const place = { residue: writeLabel({ number: firstNumber, suffix }) };
    const whole = [start, length, firstNumber].every(Number.isInteger);
    if (!whole || length < 1 || Math.max(Math.abs(firstNumber), Math.abs(last)) > MAX_LABEL_NUMBER)
      issues.error('number-unusable', `A run of ${length} residues cannot start at ${firstNumber}.`, place);
    else if (start < 0 || start + length > proteinLength) {
      const message = `A run starting at ${place.residue} reaches residue ${start + length} of a protein of ${proteinLength}.`;
      issues.error('numbering-outside', message, place);
    } else if (start < end)
      issues.error('numbering-overlap', `Residue ${start + 1} of the sequence is in two runs.`, place);
    end = Math.max(end, start + length);
  }
  if (!issues.hasErrors) reportDoubleLabels(sorted, issues);
  return issues.result({ segments: sorted });
}

function reportDoubleLabels(segments: readonly NumberingSegment[], issues: IssueList): void {
  const byNumber = [...segments].sort(
    (a, b) => a.suffix.localeCompare(b.suffix) || a.firstNumber - b.firstNumber,
  );
  byNumber.forEach((segment, index) => {
    const next = byNumber[index + 1];
    if (next === undefined || next.suffix !== segment.suffix) return;
    if (next.firstNumber >= segment.firstNumber + segment.length) return;
    const label = writeLabel({ number: next.firstNumber, suffix: next.suffix });
    issues.error('label-double', `Two residues would be called ${label}.`, { residue: label });
  });
}

/** The label of a residue, or null when it has none. */
export function labelOfResidue(numbering: Numbering, residue: ResidueIndex): string | null {
  for (const { residueIndex: start, length, firstNumber, suffix } of numbering.segments)
    if (residue >= start && residue < start + length)
      return writeLabel({ number: firstNumber + residue - start, suffix });
  return null;
}

/** The residue a label means, or null. The suffix counts in its case: 52A is not 52a. */
export function residueOfLabel(numbering: Numbering, label: string | LabelParts): ResidueIndex | null {
  const parts = typeof label === 'string' ? readLabel(label) : label;
  if (parts === null) return null;
  for (const { residueIndex: start, length, firstNumber, suffix } of numbering.segments)
    if (suffix === parts.suffix && parts.number >= firstNumber && parts.number < firstNumber + length)
      return residueIndex(start + parts.number - firstNumber);
  return null;
}

/** Labels of the first `length` residues, null where there is none. */
export function labelsOf(numbering: Numbering, length: number): (string | null)[] {
  const labels: (string | null)[] = new Array<string | null>(length).fill(null);
  for (const { residueIndex: start, length: count, firstNumber, suffix } of numbering.segments)
    for (let k = 0; k < count && start + k < length; k += 1)
      labels[start + k] = writeLabel({ number: firstNumber + k, suffix });
  return labels;
}

/** Runs of a list of labels in residue order (author numbers of a chain); null leaves a residue without one. */
export function segmentsOfLabels(labels: readonly (LabelParts | null)[]): NumberingSegment[] {
  const segments: NumberingSegment[] = [];
  labels.forEach((label, index) => {
    if (label === null) return;
    const open = segments.at(-1);
    const continues =
      open !== undefined &&
      label.suffix === '' &&
      open.suffix === '' &&
      open.residueIndex + open.length === index &&
      open.firstNumber + open.length === label.number;
    if (continues) open.length += 1;
    else
      segments.push({
        residueIndex: residueIndex(index),
        length: 1,
        firstNumber: label.number,
        suffix: label.suffix,
      });
  });
  return segments;
}
