import type { FieldPath, FieldValues, UseFormSetError } from 'react-hook-form';
import { ApiProblem } from './problem';

/** Puts the server's words at the fields they are about; says whether every one of them found its place. */
export function showFieldErrors<Values extends FieldValues>(
  error: unknown,
  known: readonly FieldPath<Values>[],
  setError: UseFormSetError<Values>,
): boolean {
  const fields = error instanceof ApiProblem ? (error.problem.fields ?? []) : [];
  const placed = fields.filter(({ path }) => known.some((name) => name === path));
  for (const { path, message } of placed)
    setError(path as FieldPath<Values>, { message }, { shouldFocus: true });
  return fields.length > 0 && placed.length === fields.length;
}
