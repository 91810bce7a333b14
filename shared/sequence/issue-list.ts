import { hasErrors, type Issue, type ParseResult } from './parse-result';

/** Most issues one reading lists, unless asked otherwise. */
export const MAX_ISSUES = 200;

/** Gathers what a reader finds; beyond the limit it only counts, and says so at the end. */
export class IssueList {
  private readonly errors: Issue[] = [];
  private readonly warnings: Issue[] = [];
  private errorCount = 0;
  private warningCount = 0;

  constructor(private readonly limit = MAX_ISSUES) {}

  error(code: string, message: string, place: Partial<Issue> = {}): void {
    this.errorCount += 1;
    if (this.errors.length < this.limit) this.errors.push({ code, severity: 'error', ...place, message });
  }

  warning(code: string, message: string, place: Partial<Issue> = {}): void {
    this.warningCount += 1;
    if (this.warnings.length < this.limit)
      this.warnings.push({ code, severity: 'warning', ...place, message });
  }

  add(issues: readonly Issue[]): void {
    for (const { code, severity, message, ...place } of issues)
      if (severity === 'error') this.error(code, message, place);
      else this.warning(code, message, place);
  }

  get hasErrors(): boolean {
    return this.errorCount > 0;
  }

  /** All issues by line; errors crowd out warnings, and a last issue counts what is not listed. */
  list(): Issue[] {
    const warningRoom = Math.max(0, this.limit - this.errors.length);
    const listed = [...this.errors, ...this.warnings.slice(0, warningRoom)];
    listed.sort((a, b) => (a.line ?? 0) - (b.line ?? 0) || (a.column ?? 0) - (b.column ?? 0));
    const more = this.errorCount + this.warningCount - listed.length;
    if (more > 0)
      listed.push({
        code: 'more-issues',
        severity: this.errorCount > this.errors.length ? 'error' : 'warning',
        message: `${more} more ${more === 1 ? 'problem is' : 'problems are'} not listed. Mend these first, then read the file again.`,
      });
    return listed;
  }

  /** The value, or null when there was an error. */
  result<T>(value: T): ParseResult<T> {
    const issues = this.list();
    return { value: hasErrors(issues) ? null : value, issues };
  }
}
