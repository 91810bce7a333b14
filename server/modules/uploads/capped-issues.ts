import type { Issue } from '../../../shared/sequence/parse-result';

/** So many issues are kept with an upload. */
const issuesAtMost = 200;

/** Errors crowd out warnings: what makes the file unusable is listed first to be kept. */
export function cappedIssues(issues: readonly Issue[], atMost = issuesAtMost): Issue[] {
  // A reader that stopped listing says how many it left out: that sentence stays, whole and last.
  const last = issues.at(-1);
  const closing = last?.code === 'more-issues' ? last : undefined;
  const listed = closing ? issues.slice(0, -1) : issues;
  if (listed.length <= atMost) return [...issues];
  const bySeverity = [...listed].sort(
    (one, other) => Number(one.severity === 'warning') - Number(other.severity === 'warning'),
  );
  const kept = new Set(bySeverity.slice(0, atMost - 1));
  const left = listed.length - kept.size;
  return [
    ...listed.filter((issue) => kept.has(issue)),
    {
      code: 'more-issues',
      severity: closing?.severity ?? 'warning',
      message: `${closing ? 'At least ' : ''}${left} more problems are not listed.`,
    },
  ];
}
