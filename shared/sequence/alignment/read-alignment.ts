import type { Issue, ParseResult } from '../parse-result';
import { decodeText } from '../text-file';
import { recognizeTextFile, type TextFileKind } from './file-kind';
import { ALIGNMENT_LIMITS, type AlignmentLimits } from './limits';
import { readAlignedFasta } from './read-fasta';
import type { Alignment } from './types';

const ADVICE =
  'Upload an aligned FASTA file: a line with > and a name, then the aligned letters, for each row.';

const REFUSALS: Readonly<Record<Exclude<TextFileKind, 'fasta'>, { code: string; message: string }>> = {
  stockholm: {
    code: 'format-not-read-yet',
    message: `This is an alignment in Stockholm format, which is not read yet. ${ADVICE}`,
  },
  blocks: {
    code: 'format-not-read-yet',
    message: `This is an alignment in interleaved blocks, which are not read yet. ${ADVICE}`,
  },
  pdb: {
    code: 'wrong-kind-coordinates',
    message:
      'This is a coordinate file in PDB format, not an alignment. Upload it under Structures, or choose the alignment.',
  },
  mmcif: {
    code: 'wrong-kind-coordinates',
    message: 'This is a PDBx/mmCIF file, not an alignment. Choose the aligned FASTA file instead.',
  },
  'flat-record': {
    code: 'wrong-kind-record',
    message: `This is an annotated sequence record, not an alignment. ${ADVICE}`,
  },
  'quality-reads': {
    code: 'wrong-kind-reads',
    message: `These are sequencing reads with qualities, not an alignment. ${ADVICE}`,
  },
  'web-page': {
    code: 'wrong-kind-web-page',
    message: `This is a web page, perhaps an error page saved in place of the file. ${ADVICE}`,
  },
  unknown: {
    code: 'kind-unknown',
    message: `The file does not begin like an alignment: the first line with text should begin with >. ${ADVICE}`,
  },
};

/**
 * Reads an uploaded alignment; its kind is recognised from the content, not from the file's name.
 * Gives every problem at once (up to `maxIssues`), lines and columns from 1 in the original file.
 * Errors of this level: `file-empty`, `file-too-large`, `file-binary`, `format-not-read-yet`,
 * `wrong-kind-…`, `kind-unknown`; the others are those of the format's reader. Never throws.
 */
export function readAlignment(
  bytes: Uint8Array,
  limits: Partial<AlignmentLimits> = {},
): ParseResult<Alignment> {
  const { maxBytes } = { ...ALIGNMENT_LIMITS, ...limits };
  const decoded = decodeText(bytes, maxBytes);
  if (decoded.value === null) return { value: null, issues: decoded.issues };
  const kind = recognizeTextFile(decoded.value);
  if (kind !== 'fasta') {
    const { code, message } = REFUSALS[kind];
    const refusal: Issue = {
      code,
      severity: 'error',
      line: firstLineWithText(decoded.value),
      column: 1,
      message,
    };
    return { value: null, issues: [...decoded.issues, refusal] };
  }
  const read = readAlignedFasta(decoded.value, limits);
  return { value: read.value, issues: [...decoded.issues, ...read.issues] };
}

function firstLineWithText(text: string): number {
  const blank = /^\s*/.exec(text)?.[0] ?? '';
  return (blank.match(/\r\n|\r|\n/g) ?? []).length + 1;
}
