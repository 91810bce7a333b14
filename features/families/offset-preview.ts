import type { Numbering, Protein } from '@/shared/contracts/families';
import {
  labelOfResidue,
  labelsOf,
  offsetNumbering,
  residueOfLabel,
  type Numbering as CoreNumbering,
} from '@/shared/sequence/numbering/numbering';
import { residueIndex } from '@/shared/sequence/positions';

/** A stored numbering as the core reads it. */
export const coreNumbering = ({ segments }: Pick<Numbering, 'segments'>): CoreNumbering => ({
  segments: segments.map((segment) => ({ ...segment, residueIndex: residueIndex(segment.residueIndex) })),
});

/** The numbering shown first on a protein. */
export const preferredOf = ({ numberings, preferredNumbering }: Protein): Numbering | undefined =>
  numberings.find(({ name }) => name === preferredNumbering);

/** The offset that makes this place of the sequence (from 1) number 1. */
export const offsetForFirst = (place: number): number => 1 - place;

/** The place of the sequence (from 1) that an offset makes number 1; it may lie outside the sequence. */
export const placeOfOne = (offset: number): number => 1 - offset;

/** Offset and missing zero of a numbering made by an offset; null for any other kind. */
export function offsetOf(numbering: Numbering): { offset: number; skipZero: boolean } | null {
  if (numbering.kind !== 'offset') return null;
  const positive = numbering.segments.find(({ firstNumber, length }) => firstNumber + length > 1);
  const run = positive ?? numbering.segments[0];
  if (!run) return null;
  const hasNegative = numbering.segments.some(({ firstNumber }) => firstNumber < 0);
  const hasZero = numbering.segments.some(
    ({ firstNumber, length }) => firstNumber <= 0 && firstNumber + length > 0,
  );
  const skipZero = hasNegative && !hasZero;
  // Without a positive label the numbers below the missing zero are one lower than the offset says.
  const shift = skipZero && !positive ? 1 : 0;
  return { offset: run.firstNumber + shift - (run.residueIndex + 1), skipZero };
}

export interface PreviewRow {
  /** What this residue is in the protein. */
  what: string;
  /** Place in the sequence, from 1. */
  place: number;
  letter: string;
  label: string;
}

/** What an offset makes of the first residue, of number 1, of one more that is asked for, and of the last. */
export function previewOffset(
  residues: string,
  { offset, skipZero }: { offset: number; skipZero: boolean },
  askedPlace: number | null,
): PreviewRow[] {
  const numbering = offsetNumbering(residues.length, offset, { skipZero });
  const one = residueOfLabel(numbering, '1');
  const places: [string, number | null][] = [
    ['first residue', 1],
    ['number 1', one === null ? null : one + 1],
    ['asked for', askedPlace],
    ['last residue', residues.length],
  ];
  return places.flatMap(([what, place]) => {
    if (place === null || place < 1 || place > residues.length) return [];
    const label = labelOfResidue(numbering, residueIndex(place - 1)) ?? 'no label';
    return [{ what, place, letter: residues.charAt(place - 1), label }];
  });
}

/** First and last label of a numbering, in the order of the residues. */
export function labelRange(numbering: Numbering, length: number): { first: string; last: string } {
  const core = coreNumbering(numbering);
  const at = (index: number) => labelOfResidue(core, residueIndex(index)) ?? 'no label';
  return { first: at(0), last: at(length - 1) };
}

/** The residue a label means in a numbering, or null. */
export const placeOfLabel = (numbering: Numbering, label: string): number | null =>
  residueOfLabel(coreNumbering(numbering), label);

/** Every letter of a protein with its label in a numbering. */
export function labelledLetters(protein: Protein, numbering: Numbering | undefined) {
  const labels = labelsOf(numbering ? coreNumbering(numbering) : { segments: [] }, protein.residues.length);
  return [...protein.residues].map((code, index) => ({ code, number: labels[index] ?? null, index }));
}
