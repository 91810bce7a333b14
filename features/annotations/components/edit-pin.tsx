import { zodResolver } from '@hookform/resolvers/zod';
import { useEffect, useRef, useState } from 'react';
import { useForm } from 'react-hook-form';
import { annotation as annotationShape, type Annotation } from '@/shared/contracts/annotations';
import { Form } from '@/components/form';
import { Button, Loading, Row } from '@/components/ui';
import { showFieldErrors } from '@/client/field-errors';
import { conflictOf } from '@/client/problem';
import { useDraft } from '@/client/use-draft';
import {
  annotationValues,
  bodyOf,
  editDraft,
  valuesOf,
  type AnnotationValues,
  type EditDraft,
} from '../annotation-values';
import { useEditAnnotation } from '../use-annotations';
import { AnnotationFields } from './annotation-fields';
import { Conflict } from './conflict';
import { FormFrame } from './form-frame';
import { Refusal } from './refusal';

interface EditPinProps {
  projectId: string;
  annotation: Annotation;
  open: boolean;
  onClose: () => void;
}

/** Another text for a statement; the old ones stay. Should somebody else save meanwhile, both texts are shown. */
export function EditPin(props: EditPinProps) {
  const { projectId, annotation, open, onClose } = props;
  const draft = useDraft(`annotation:${projectId}:${annotation.id}`);
  return (
    <FormFrame open={open} onClose={onClose} title="Edit this pin">
      {open && draft.text === null ? <Loading>Reading the draft</Loading> : null}
      {open && draft.text !== null ? (
        <EditForm
          {...props}
          kept={readDraft(draft.text)}
          keep={(next) => draft.type(JSON.stringify(next))}
          done={() => {
            void draft.clear();
            onClose();
          }}
        />
      ) : null}
    </FormFrame>
  );
}

function readDraft(text: string): EditDraft | null {
  try {
    const parsed = editDraft.safeParse(JSON.parse(text));
    return parsed.success ? parsed.data : null;
  } catch {
    return null;
  }
}

interface EditFormProps extends EditPinProps {
  kept: EditDraft | null;
  keep: (draft: EditDraft) => void;
  /** It was saved, or given up. */
  done: () => void;
}

function EditForm({ projectId, annotation, kept, keep, done }: EditFormProps) {
  const edit = useEditAnnotation(projectId);
  // What the text was begun on stays the base while others save.
  const [base] = useState(kept?.base ?? annotation);
  const [theirs, setTheirs] = useState<Annotation | null>(null);
  const form = useForm<AnnotationValues>({
    resolver: zodResolver(annotationValues),
    defaultValues: kept?.values ?? valuesOf(annotation),
  });
  const latestKeep = useRef(keep);
  useEffect(() => {
    latestKeep.current = keep;
  });
  useEffect(() => {
    const watching = form.watch(() => latestKeep.current({ base, values: form.getValues() }));
    return () => watching.unsubscribe();
  }, [form, base]);

  const save = (values: AnnotationValues, version: number) =>
    edit.mutate(
      { annotationId: annotation.id, version, body: bodyOf(values) },
      {
        onSuccess: done,
        onError: (error) => {
          const other = conflictOf(error, annotationShape);
          if (other && other.versionNumber > base.versionNumber) setTheirs(other);
          else showFieldErrors(error, ['kind', 'text', 'confidence', 'evidence'], form.setError);
        },
      },
    );
  if (theirs)
    return (
      <Conflict
        key={theirs.versionNumber}
        base={base}
        mine={form.getValues()}
        theirs={theirs}
        isSaving={edit.isPending}
        problem={edit.error?.status === 412 ? null : edit.error}
        onSave={(values) => {
          // Kept as the draft too, should this one not arrive either.
          form.reset(values);
          save(values, theirs.version);
        }}
        onTakeTheirs={done}
      />
    );
  // Somebody who only accepted or contested it left the text as it was begun on.
  const version = annotation.versionNumber === base.versionNumber ? annotation.version : base.version;
  const submit = form.handleSubmit((values) => save(values, version));
  return (
    <Form onSubmit={() => void submit()} gap={14}>
      <AnnotationFields control={form.control} />
      <Refusal problem={edit.error} />
      <Row justify="between" wrap>
        <Button kind="quiet" onPress={done}>
          Drop the changes
        </Button>
        <Button kind="primary" submit busyText={edit.isPending ? 'Saving' : undefined}>
          Save
        </Button>
      </Row>
    </Form>
  );
}
