import { MAX_ISSUES } from '../issue-list';
import { MAX_TEXT_BYTES } from '../text-file';

/** How much an alignment reader takes on. */
export interface AlignmentLimits {
  maxBytes: number;
  maxRows: number;
  maxColumns: number;
  /** Longest row name, in characters. */
  maxNameLength: number;
  /** Longest description kept; longer ones are cut with a warning. */
  maxDescriptionLength: number;
  maxIssues: number;
}

export const ALIGNMENT_LIMITS: AlignmentLimits = {
  maxBytes: MAX_TEXT_BYTES,
  maxRows: 50_000,
  maxColumns: 100_000,
  maxNameLength: 200,
  maxDescriptionLength: 2_000,
  maxIssues: MAX_ISSUES,
};
