import type { Issue } from '../../../shared/sequence/parse-result';

/** So many issues are kept with an upload. */
const issuesAtMost = 200;

/** Errors crowd out warnings: what makes the file unusable is listed first to be kept. */
export function cappedIssues(issues: readonly Issue[], atMost = issuesAtMost): Issue[] {
  if (issues.length <= atMost) return [...issues];
  const bySeverity = [...issues].sort(
    (one, other) => Number(one.severity === 'warning') - Number(other.severity === 'warning'),
  );
  const kept = new Set(bySeverity.slice(0, atMost - 1));
  const left = issues.length - kept.size;
  return [
    ...issues.filter((issue) => kept.has(issue)),
    { code: 'more-issues', severity: 'warning', message: `${left} more problems are not listed.` },
  ];
}
