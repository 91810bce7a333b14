import { IssueList } from '../issue-list';
import type { ParseResult } from '../parse-result';
import { decodeText } from '../text-file';
import { checkEmptyRows, checkProtein } from './compare-rows';
import { readFastaRecords, shown } from './fasta-records';
import { ALIGNMENT_LIMITS, type AlignmentLimits } from './limits';
import { dropStopMarks } from './stop-marks';

export interface NamedSequence {
  name: string;
  description: string;
  /** Upper case, without gaps. */
  residues: string;
}

/**
 * Reads protein sequences that need not be aligned, from FASTA. Gaps are left out with the warning
 * `gaps-left-out`. Errors: those of `decodeText`, `no-rows`, `row-empty`, `row-without-residues`, `rows-are-dna`,
 * `stop-inside-row`, `letter-unknown`. Never throws.
 */
export function readProteinSequences(
  bytes: Uint8Array,
  limits: Partial<AlignmentLimits> = {},
): ParseResult<NamedSequence[]> {
  const all = { ...ALIGNMENT_LIMITS, ...limits };
  const decoded = decodeText(bytes, all.maxBytes);
  if (decoded.value === null) return { value: null, issues: decoded.issues };
  const issues = new IssueList(all.maxIssues);
  issues.add(decoded.issues);
  const records = readFastaRecords(decoded.value, all, issues);
  if (records.length === 0)
    issues.error('no-rows', 'The file holds no sequence. One begins with > and a name.');
  dropStopMarks(records, issues);
  checkEmptyRows(records, issues);
  checkProtein(records, issues);
  const sequences = records.map(({ name, description, text, line }) => {
    const residues = text.replace(/[-.~]+/g, '').toUpperCase();
    if (residues.length < text.length && residues !== '')
      issues.warning('gaps-left-out', `Gaps in ${shown(name)} were left out.`, { line, column: 1 });
    return { name, description, residues };
  });
  return issues.result(sequences);
}
