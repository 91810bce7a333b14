import { useEffect } from 'react';
import type { FieldValues, UseFormReturn } from 'react-hook-form';

/** What the server refused is no longer said once the form holds something else. */
export function useForgetRefusal<Values extends FieldValues>(
  form: UseFormReturn<Values>,
  act: { isError: boolean; reset: () => void },
): void {
  const { watch, clearErrors } = form;
  const { isError, reset } = act;
  useEffect(() => {
    if (!isError) return undefined;
    const watching = watch(() => {
      reset();
      clearErrors();
    });
    return () => watching.unsubscribe();
  }, [isError, reset, watch, clearErrors]);
}
