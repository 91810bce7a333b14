/** One thing wrong, or doubtful, in a person's input. Lines and columns count from 1, as an editor shows them. */
export interface Issue {
  code: string;
  severity: 'error' | 'warning';
  line?: number;
  column?: number;
  chain?: string;
  residue?: string;
  message: string;
}

/** What every reader gives back: the value, or null when an error makes it unusable, and all issues found. */
export interface ParseResult<T> {
  value: T | null;
  issues: Issue[];
}

export function hasErrors(issues: readonly Issue[]): boolean {
  return issues.some((issue) => issue.severity === 'error');
}
