import { useEffect, useRef } from 'react';
import type { FieldValues, UseFormReturn } from 'react-hook-form';
import type { z } from 'zod';
import { useDraft } from '@/client/use-draft';

export interface FormDraft<Values> {
  /** What another tab filled in at the same place meanwhile. */
  elsewhere: Values | null;
  takeElsewhere: () => void;
  /** After the server took it. */
  clear: () => void;
}

/** Keeps what is filled in across reloads and tabs. A form never sends itself; only its text is kept. */
export function useFormDraft<Values extends FieldValues>(
  place: string,
  form: UseFormReturn<Values>,
  shape: z.ZodType<Values>,
): FormDraft<Values> {
  const draft = useDraft(place);
  const { reset, watch } = form;
  const { text, type, clear } = draft;
  const taken = useRef<string | null>(null);

  useEffect(() => {
    if (text === null || taken.current === place) return;
    taken.current = place;
    const kept = parse(text, shape);
    if (kept) reset(kept, { keepDefaultValues: true });
  }, [text, place, reset, shape]);

  useEffect(() => {
    const watching = watch((values, { type: cause }) => {
      if (cause === 'change' || taken.current === place) type(JSON.stringify(values));
    });
    return () => watching.unsubscribe();
  }, [watch, type, place]);

  const other = draft.elsewhere ? parse(draft.elsewhere.text, shape) : null;
  return {
    elsewhere: other,
    takeElsewhere: () => {
      draft.takeElsewhere();
      if (other) reset(other, { keepDefaultValues: true });
    },
    clear: () => void clear(),
  };
}

function parse<Values>(text: string, shape: z.ZodType<Values>): Values | null {
  if (text === '') return null;
  try {
    const parsed = shape.safeParse(JSON.parse(text));
    return parsed.success ? parsed.data : null;
  } catch {
    return null;
  }
}
