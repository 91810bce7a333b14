import type { Issue } from '@/shared/sequence/parse-result';

/** Issues in the order found, at most so many of one code; what is over is counted and told in one line. */
export class IssueList {
  private readonly kept: Issue[] = [];
  private readonly counts = new Map<string, number>();

  constructor(private readonly perCode: number) {}

  add(issue: Issue): void {
    const count = this.counts.get(issue.code) ?? 0;
    if (count < this.perCode) this.kept.push(issue);
    this.counts.set(issue.code, count + 1);
  }

  warn(code: string, message: string, where: Omit<Issue, 'code' | 'severity' | 'message'> = {}): void {
    this.add({ code, severity: 'warning', ...where, message });
  }

  error(code: string, message: string, where: Omit<Issue, 'code' | 'severity' | 'message'> = {}): void {
    this.add({ code, severity: 'error', ...where, message });
  }

  toArray(): Issue[] {
    const all = [...this.kept];
    for (const [code, count] of this.counts) {
      const last = this.kept.findLast((issue) => issue.code === code);
      if (count <= this.perCode || !last) continue;
      const more = count - this.perCode;
      all.push({ code, severity: last.severity, message: `${more} more of this kind (${count} in all).` });
    }
    return all;
  }
}
