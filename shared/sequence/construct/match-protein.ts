import { compareLetters } from '../alphabet';
import { alignPair, DEFAULT_GAP_RULES, fitsInMemory, type PairSegment } from '../mapping/pairwise';
import type { Issue, ParseResult } from '../parse-result';
import { residueIndex, type BaseIndex, type ResidueIndex } from '../positions';
import { wrap } from './bases';
import type { Coding } from './coding';
import { findProtein } from './find-protein';
import { KNOWN_TAGS } from './tags.data';

/** A run of codons that encode a run of residues. */
export interface CodonSegment {
  /** Codon from 0, counted from the start of the coding part. */
  codon: number;
  residueIndex: ResidueIndex;
  length: number;
}

export interface CodonMismatch {
  codon: number;
  residueIndex: ResidueIndex;
  /** First base of the codon, from 0, on the strand as given. */
  base: BaseIndex;
  encoded: string;
  expected: string;
}

/** Residues the construct adds outside the protein. */
export interface ConstructTag {
  end: 'N' | 'C';
  residues: string;
  /** Tags and protease sites recognised in it. */
  names: string[];
}

export interface ProteinMatch {
  segments: CodonSegment[];
  tags: ConstructTag[];
  /** residue index − codon, when it is the same all along; else null. */
  offset: number | null;
  mismatches: CodonMismatch[];
  /** Identical ÷ compared pairs. */
  identity: number;
  /** Aligned residues ÷ length of the protein. */
  coverage: number;
}

/** What counts as "encodes this protein" [common practice, no source]. */
export interface MatchLimits {
  minimumIdentity: number;
  minimumCoverage: number;
}
export const MATCH_LIMITS: MatchLimits = { minimumIdentity: 0.95, minimumCoverage: 0.8 };

/** A mismatch run this short, at an end that goes on unaligned, belongs to the tag. */
const TAG_EDGE_RESIDUES = 3;

const percent = (fraction: number) => `${Math.round(fraction * 1000) / 10} %`;

function alignSegments(encoded: string, protein: string): PairSegment[] {
  const inside = encoded.indexOf(protein);
  if (inside >= 0) return [{ aStart: inside, bStart: 0, length: protein.length }];
  const part = protein.indexOf(encoded);
  if (part >= 0) return [{ aStart: 0, bStart: part, length: encoded.length }];
  const { segments } = alignPair(encoded, protein, DEFAULT_GAP_RULES);
  return trimTagEdges(segments, encoded, protein);
}

/** With free ends the protein's Met pairs with the tag's last residue; such a pair is the tag, not a mismatch. */
function trimTagEdges(segments: PairSegment[], encoded: string, protein: string): PairSegment[] {
  const trimmed = segments.map((segment) => ({ ...segment }));
  const differs = (a: number, b: number) =>
    compareLetters(encoded.charAt(a), protein.charAt(b)) === 'different';
  const first = trimmed[0];
  const last = trimmed[trimmed.length - 1];
  if (!first || !last) return trimmed;
  let head = 0;
  while (head < first.length && differs(first.aStart + head, first.bStart + head)) head += 1;
  if (head <= TAG_EDGE_RESIDUES && first.aStart > 0 && first.bStart === 0) {
    first.aStart += head;
    first.bStart += head;
    first.length -= head;
  }
  const endA = last.aStart + last.length;
  const endB = last.bStart + last.length;
  let tail = 0;
  while (tail < last.length && differs(endA - 1 - tail, endB - 1 - tail)) tail += 1;
  if (tail <= TAG_EDGE_RESIDUES && endA < encoded.length && endB === protein.length) last.length -= tail;
  return trimmed.filter((segment) => segment.length > 0);
}

function describe(coding: Coding, protein: string, segments: PairSegment[]): ProteinMatch {
  const encoded = coding.protein;
  const mismatches: CodonMismatch[] = [];
  let identical = 0;
  let determined = 0;
  let aligned = 0;
  for (const { aStart, bStart, length } of segments)
    for (let step = 0; step < length; step += 1) {
      const codon = aStart + step;
      const relation = compareLetters(encoded.charAt(codon), protein.charAt(bStart + step));
      aligned += 1;
      if (relation === 'undetermined') continue;
      determined += 1;
      if (relation === 'identical') identical += 1;
      else
        mismatches.push({
          codon,
          residueIndex: residueIndex(bStart + step),
          base: coding.codonStarts[codon] ?? coding.start,
          encoded: encoded.charAt(codon),
          expected: protein.charAt(bStart + step),
        });
    }
  const tag = (end: 'N' | 'C', residues: string): ConstructTag[] =>
    residues === ''
      ? []
      : [
          {
            end,
            residues,
            names: KNOWN_TAGS.filter(({ pattern }) => pattern.test(residues)).map(({ name }) => name),
          },
        ];
  const first = segments[0];
  const last = segments[segments.length - 1];
  const offsets = new Set(segments.map(({ aStart, bStart }) => bStart - aStart));
  return {
    segments: segments.map(({ aStart, bStart, length }) => ({
      codon: aStart,
      residueIndex: residueIndex(bStart),
      length,
    })),
    tags:
      first && last
        ? [...tag('N', encoded.slice(0, first.aStart)), ...tag('C', encoded.slice(last.aStart + last.length))]
        : [],
    offset: offsets.size === 1 ? ([...offsets][0] ?? null) : null,
    mismatches,
    identity: determined === 0 ? 0 : identical / determined,
    coverage: protein.length === 0 ? 0 : aligned / protein.length,
  };
}

/** First difference to the right of the longest identical run, or else to its left: [codon, residue], from 0. */
function findBreak(encoded: string, protein: string, segments: PairSegment[]): [number, number] {
  let best = { a: 0, b: 0, length: 0 };
  for (const { aStart, bStart, length } of segments)
    for (let step = 0, run = 0; step < length; step += 1) {
      run = encoded.charAt(aStart + step) === protein.charAt(bStart + step) ? run + 1 : 0;
      if (run > best.length) best = { a: aStart + step - run + 1, b: bStart + step - run + 1, length: run };
    }
  const rightEnd = best.b + best.length;
  if (rightEnd < protein.length) return [best.a + best.length, rightEnd];
  return [Math.max(0, best.a - 1), Math.max(0, best.b - 1)];
}

/** What the DNA has where the protein no longer fits; bases from 1. `size` is needed only across the origin of a circle. */
function breakWords(coding: Coding, codon: number, size: number | undefined): string {
  const { codonStarts, protein, strand, hasStop } = coding;
  const read = protein.charAt(codon);
  if (read !== '') return `base ${(codonStarts[codon] ?? 0) + 1}, where the DNA reads ${read}`;
  const lastCodon = codonStarts[protein.length - 1] ?? coding.start;
  const unwrapped = lastCodon + (strand === '+' ? 2 : -2);
  const last = (size === undefined ? unwrapped : wrap(unwrapped, size)) + 1;
  return hasStop ? `where a stop follows base ${last}` : `where the DNA ends at base ${last}`;
}

/**
 * Which codon encodes which residue of a protein. The construct may add tags, lack an end or differ in single residues; these are
 * listed. Indices from 0; the bases named in issues count from 1, residues are named by `labelOf` (from 1 when it is left out).
 *
 * Errors: `protein-not-encoded` (best match and where it breaks, and where else the construct encodes it, when `bases` is given),
 * `protein-empty`, `too-long-to-align`. Warnings: `encoded-mismatch` (one each), `encoded-gap`.
 * Free-ended global alignment with BLOSUM62 where the one does not simply contain the other.
 */
export function matchProtein(
  coding: Coding,
  protein: string,
  options: { bases?: string; labelOf?: (index: ResidueIndex) => string; limits?: Partial<MatchLimits> } = {},
): ParseResult<ProteinMatch> {
  const limits = { ...MATCH_LIMITS, ...options.limits };
  const labelOf = options.labelOf ?? ((index: ResidueIndex) => String(index + 1));
  const refuse = (code: string, message: string, residue?: string): ParseResult<ProteinMatch> => ({
    value: null,
    issues: [{ code, severity: 'error', message, ...(residue ? { residue } : {}) }],
  });
  const encoded = coding.protein;
  if (protein.length === 0) return refuse('protein-empty', 'The protein has no residues.');
  if (!fitsInMemory(encoded.length, protein.length))
    return refuse(
      'too-long-to-align',
      `${encoded.length} codons and ${protein.length} residues are too many to align.`,
    );
  const segments = alignSegments(encoded, protein);
  const match = describe(coding, protein, segments);
  if (match.identity < limits.minimumIdentity || match.coverage < limits.minimumCoverage) {
    const [codon, residue] = findBreak(encoded, protein, segments);
    const label = labelOf(residueIndex(residue));
    const [elsewhere] = options.bases
      ? findProtein(options.bases, coding.circular, protein, coding.table)
      : [];
    const hint = elsewhere
      ? ` The whole protein is encoded from base ${elsewhere.start + 1} on the ${elsewhere.strand === '+' ? 'strand as given' : 'reverse strand'}.`
      : '';
    return refuse(
      'protein-not-encoded',
      `The coding part does not encode this protein: the best match covers ${percent(match.coverage)} of it with ${percent(match.identity)} identical, and breaks at residue ${label} (${protein.charAt(residue)}), ${breakWords(coding, codon, options.bases?.length)}.${hint}`,
      label,
    );
  }
  const issues: Issue[] = match.mismatches.map((mismatch) => ({
    code: 'encoded-mismatch',
    severity: 'warning',
    residue: labelOf(mismatch.residueIndex),
    message: `At ${labelOf(mismatch.residueIndex)} the construct encodes ${mismatch.encoded} where the protein has ${mismatch.expected} (base ${mismatch.base + 1}).`,
  }));
  if (segments.length > 1)
    issues.push({
      code: 'encoded-gap',
      severity: 'warning',
      message: `The construct lacks or adds residues within the protein, in ${segments.length - 1} places.`,
    });
  return { value: match, issues };
}

/** The codon (from 0) that encodes a residue, or null when the construct does not hold it. */
export function codonOfResidue(match: ProteinMatch, residue: ResidueIndex): number | null {
  for (const segment of match.segments) {
    const step = residue - segment.residueIndex;
    if (step >= 0 && step < segment.length) return segment.codon + step;
  }
  return null;
}
