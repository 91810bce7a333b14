import { zodResolver } from '@hookform/resolvers/zod';
import type { ReactNode } from 'react';
import { Controller, useForm } from 'react-hook-form';
import Pin from 'lucide-react-native/icons/pin';
import type { ResidueLabel } from '@/shared/contracts/common';
import { Form } from '@/components/form';
import { Plate, plateWords } from '@/components/residue';
import { Banner, Button, Row, Text } from '@/components/ui';
import { showFieldErrors } from '@/client/field-errors';
import { useFormDraft } from '@/client/use-form-draft';
import {
  annotationDraft,
  annotationValues,
  bodyOf,
  emptyValues,
  type AnnotationValues,
} from '../annotation-values';
import { useMakeAnnotation } from '../use-annotations';
import { AnnotationFields } from './annotation-fields';
import { FormFrame } from './form-frame';
import { Refusal } from './refusal';

/** Draws the field in which a second residue is typed and found. */
export type PartnerField = (field: {
  value: ResidueLabel | null;
  onChange: (next: ResidueLabel | null) => void;
}) => ReactNode;

interface NewPinProps {
  projectId: string;
  residue: ResidueLabel;
  open: boolean;
  onClose: () => void;
  partnerField: PartnerField;
}

/** A new statement, pinned on this residue, or on this and a second one. What is typed is kept until it is pinned. */
export function NewPin(props: NewPinProps) {
  return (
    <FormFrame open={props.open} onClose={props.onClose} title="Pin here">
      {props.open ? <NewPinForm {...props} /> : null}
    </FormFrame>
  );
}

function NewPinForm({ projectId, residue, onClose, partnerField }: NewPinProps) {
  const make = useMakeAnnotation(projectId);
  const form = useForm<AnnotationValues>({
    resolver: zodResolver(annotationValues),
    defaultValues: emptyValues,
  });
  const { proteinId, residueIndex } = residue;
  const draft = useFormDraft(`pin:${projectId}:${proteinId}:${residueIndex}`, form, annotationDraft);
  const submit = form.handleSubmit((values) => {
    const { partner } = values;
    const pins = [
      { proteinId, residueIndex },
      ...(partner ? [{ proteinId: partner.proteinId, residueIndex: partner.residueIndex }] : []),
    ];
    make.mutate(
      { pins, ...bodyOf(values) },
      {
        onSuccess: () => {
          draft.clear();
          onClose();
        },
        onError: (error) =>
          void showFieldErrors(error, ['kind', 'text', 'confidence', 'evidence'], form.setError),
      },
    );
  });
  return (
    <Form onSubmit={() => void submit()} gap={14}>
      <Row gap={8} wrap>
        <Plate size={32} {...plateWords(residue)} />
        <Text kind="small" tone="soft">
          {`${residue.numbering} numbering, `}
          <em>{residue.organism}</em>. It holds for all copies.
        </Text>
      </Row>
      {draft.elsewhere ? (
        <Banner kind="warn" action={<Button onPress={draft.takeElsewhere}>Take it</Button>}>
          Another tab holds a different draft for this residue.
        </Banner>
      ) : null}
      <AnnotationFields control={form.control} />
      <Controller
        control={form.control}
        name="partner"
        render={({ field }) => <>{partnerField({ value: field.value, onChange: field.onChange })}</>}
      />
      <Refusal problem={make.error} />
      <Row justify="between" wrap>
        <Button kind="quiet" onPress={onClose}>
          Later, keep the draft
        </Button>
        <Button kind="primary" icon={Pin} submit busyText={make.isPending ? 'Pinning' : undefined}>
          Pin
        </Button>
      </Row>
    </Form>
  );
}
