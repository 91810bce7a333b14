import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import type { Annotation, AnnotationStatus } from '@/shared/contracts/annotations';
import { BoundArea, Form } from '@/components/form';
import { Button, Row, Text } from '@/components/ui';
import { showFieldErrors } from '@/client/field-errors';
import { useSetAnnotationStatus } from '../use-annotations';
import { FormFrame } from './form-frame';
import { Refusal } from './refusal';

const reasonValues = z.object({
  reason: z
    .string()
    .trim()
    .min(1, 'Write a reason: the others want to know.')
    .max(2000, 'At most 2,000 characters.'),
});
type ReasonValues = z.infer<typeof reasonValues>;

const words: Partial<Record<AnnotationStatus, { title: string; sentence: string; verb: string }>> = {
  contested: {
    title: 'Contest this pin?',
    sentence: 'It stays where it is, marked as contested with your reason, until it is accepted or retired.',
    verb: 'Contest',
  },
  retired: {
    title: 'Retire this pin?',
    sentence: 'It leaves the lists on all copies. It stays in the history and can be proposed again.',
    verb: 'Retire',
  },
};

interface ReasonDialogProps {
  projectId: string;
  annotation: Annotation;
  /** The step that asks for a reason; null while none is asked. */
  to: AnnotationStatus | null;
  onClose: () => void;
}

/** A step that has to be given a reason. */
export function ReasonDialog({ to, onClose, ...rest }: ReasonDialogProps) {
  const said = to ? words[to] : undefined;
  return (
    <FormFrame open={said !== undefined} title={said?.title} onClose={onClose}>
      {to && said ? <ReasonForm {...rest} to={to} said={said} onClose={onClose} /> : null}
    </FormFrame>
  );
}

interface ReasonFormProps extends ReasonDialogProps {
  to: AnnotationStatus;
  said: { sentence: string; verb: string };
}

function ReasonForm({ projectId, annotation, to, said, onClose }: ReasonFormProps) {
  const set = useSetAnnotationStatus(projectId);
  const { control, handleSubmit, setError } = useForm<ReasonValues>({
    resolver: zodResolver(reasonValues),
    defaultValues: { reason: '' },
  });
  const submit = handleSubmit(({ reason }) =>
    set.mutate(
      { annotationId: annotation.id, version: annotation.version, body: { status: to, reason } },
      { onSuccess: onClose, onError: (error) => void showFieldErrors(error, ['reason'], setError) },
    ),
  );
  return (
    <Form onSubmit={() => void submit()} gap={12}>
      <Text kind="small" tone="soft">
        {said.sentence}
      </Text>
      <BoundArea control={control} name="reason" label="Reason" rows={3} required />
      <Refusal problem={set.error} />
      <Row justify="end" wrap>
        <Button kind="quiet" onPress={onClose}>
          Leave it
        </Button>
        <Button kind="danger" submit busyText={set.isPending ? 'Saving' : undefined}>
          {said.verb}
        </Button>
      </Row>
    </Form>
  );
}
