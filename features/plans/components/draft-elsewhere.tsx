import { Banner, Button } from '@/components/ui';
import type { FormDraft } from '@/client/use-form-draft';

/** The same form was filled in otherwise in another tab: both are kept until one is taken. */
export function DraftElsewhere<Values>({ draft }: { draft: FormDraft<Values> }) {
  if (draft.elsewhere === null) return null;
  return (
    <Banner kind="note" action={<Button onPress={draft.takeElsewhere}>Take the other</Button>}>
      This form was filled in otherwise in another tab. What stands here is kept as well.
    </Banner>
  );
}
