import { Banner } from '@/components/ui';
import type { ApiProblem } from '@/client/problem';

/** Why the server did not take it, with each field it names. */
export function Refusal({ problem }: { problem: ApiProblem | null }) {
  if (!problem) return null;
  const fields = problem.problem.fields ?? [];
  return (
    <Banner kind="danger">
      {problem.message}
      {fields.length > 0 ? (
        <ul>
          {fields.map(({ path, message }) => (
            <li key={path}>{`${path}: ${message}`}</li>
          ))}
        </ul>
      ) : null}
    </Banner>
  );
}
