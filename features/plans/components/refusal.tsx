import { Banner, IssueList, Stack, type IssueView } from '@/components/ui';
import type { ApiProblem } from '@/client/problem';

interface CodedIssue {
  code: string;
  severity: 'error' | 'warning';
  line?: number | undefined;
  column?: number | undefined;
  message: string;
}

/** Issues of the core or the server as the list shows them, errors first. */
export function issueViews(issues: readonly CodedIssue[]): IssueView[] {
  const views = issues.map(({ severity, line, column, message }, place) => ({
    key: String(place),
    severity,
    line,
    column,
    sentence: message,
  }));
  return [...views.filter(({ severity }) => severity === 'error'), ...views.filter(isWarning)];
}
const isWarning = ({ severity }: { severity: string }) => severity === 'warning';

export interface RefusalProps {
  /** "Not stored": what did not happen. */
  outcome: string;
  problem: ApiProblem | null;
}

/** Why the server did not do it, with every issue at its place. */
export function Refusal({ outcome, problem }: RefusalProps) {
  if (!problem) return null;
  const issues = problem.problem.issues ?? [];
  // What the sentence says already is not said again; warnings were shown before it was sent.
  const further = issues.filter(
    ({ severity, message }) => severity === 'error' && !problem.message.includes(message),
  );
  return (
    <Stack gap={8}>
      <Banner kind="danger">
        <b>{outcome}.</b> {problem.message}
      </Banner>
      {further.length > 0 ? <IssueList label={`${outcome}: why`} issues={issueViews(further)} /> : null}
    </Stack>
  );
}
