import { useEffect, useState } from 'react';
import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { protein as proteinSchema, type Numbering, type Protein } from '@/shared/contracts/families';
import { BoundCheckbox, BoundText, Form, TextInput } from '@/components/form';
import { Banner, BothTexts, Button, Segment, Text } from '@/components/ui';
import { showFieldErrors } from '@/client/field-errors';
import { conflictOf } from '@/client/problem';
import {
  bodyOf,
  offsetForm,
  offsetIn,
  ruleWords,
  storedRule,
  toldAs,
  valuesOf,
  type OffsetValues,
} from '../offset-form-values';
import { useSetOffsetNumbering } from '../use-families';
import { OffsetPreviewTable } from './offset-preview-table';

interface OffsetFormProps {
  projectId: string;
  protein: Protein;
  /** The numbering to change; left out, a new one. */
  numbering?: Numbering;
}

const ways = [
  { value: 'one', label: 'by number 1' },
  { value: 'offset', label: 'by offset' },
];

/** One numbering made by an offset. It is saved against the protein as it was when the form began. */
export function OffsetForm({ projectId, protein, numbering }: OffsetFormProps) {
  const act = useSetOffsetNumbering(projectId);
  const [base, setBase] = useState(protein.version);
  const [asked, setAsked] = useState('');
  const form = useForm<OffsetValues>({
    resolver: zodResolver(offsetForm),
    defaultValues: valuesOf(protein, numbering),
  });
  const { control, handleSubmit, setError, setValue, getValues, watch, reset } = form;
  const { isDirty } = form.formState;
  const values = watch();
  const offset = offsetIn(values);
  const theirs = conflictOf(act.error, proteinSchema);
  // A form nobody has touched shows what is true now.
  const numberingId = numbering?.id;
  useEffect(() => {
    if (isDirty || protein.version <= base) return;
    const name = getValues('name');
    const there = protein.numberings.find((one) => one.id === numberingId || one.name === name);
    setBase(protein.version);
    reset(valuesOf(protein, there));
  }, [isDirty, base, protein, numberingId, getValues, reset]);
  const save = (version: number) =>
    void handleSubmit((written) =>
      act.mutate(
        { proteinId: protein.id, version, body: bodyOf(written) },
        {
          onSuccess: (saved) => {
            setBase(saved.version);
            reset(written);
          },
          onError: (error) => void showFieldErrors(error, ['name'], setError),
        },
      ),
    )();
  const busyText = act.isPending ? 'Saving' : undefined;
  return (
    <Form onSubmit={() => save(base)}>
      <BoundText
        control={control}
        name="name"
        label="Name"
        hint="Shown beside every number: mature, precursor."
        required
      />
      <Segment
        label="How it is given"
        options={ways}
        value={values.way}
        onChange={(way) => {
          const next = way === 'offset' ? 'offset' : 'one';
          setValue('number', toldAs(next, values), { shouldDirty: true });
          setValue('way', next);
        }}
      />
      <BoundText
        control={control}
        name="number"
        label={
          values.way === 'one'
            ? 'Number 1 is this residue of the sequence'
            : 'Added to the place in the sequence'
        }
        hint={
          values.way === 'one'
            ? 'The first residue of the mature chain, counted in the uploaded row without gaps.'
            : 'Minus 50 makes residue 51 number 1.'
        }
        mono
        required
      />
      <TextInput
        label="Try it on one more residue of the sequence"
        mono
        inputMode="numeric"
        value={asked}
        onChange={setAsked}
      />
      {offset === null ? (
        <Text tone="soft">Write a number to see what becomes of the residues.</Text>
      ) : (
        <OffsetPreviewTable
          protein={protein}
          rule={{ offset, skipZero: values.skipZero }}
          askedPlace={/^\d+$/.test(asked.trim()) ? Number(asked) : null}
          name={values.name}
        />
      )}
      <BoundCheckbox
        control={control}
        name="skipZero"
        label="There is no residue 0"
        hint="As some older papers count: minus 1, then 1."
      />
      <BoundCheckbox
        control={control}
        name="preferred"
        label="Show this numbering first"
        hint="For everybody, on every protein of this family that has one of this name."
      />
      {/* Beside the button that was pressed: the beginning of the form is out of sight by then. */}
      {act.error && !theirs ? <Banner kind="danger">{act.error.message}</Banner> : null}
      {act.isSuccess && !isDirty ? (
        <Banner kind="good">{`Saved. Every screen shows ${values.name} numbers where it is preferred.`}</Banner>
      ) : null}
      {theirs ? (
        <BothTexts
          sentence="Somebody changed this protein meanwhile."
          rows={[
            {
              key: 'rule',
              name: values.name,
              theirs: storedRule(theirs, values.name),
              mine: ruleWords(bodyOf(values)),
            },
            {
              key: 'organism',
              name: 'Organism',
              theirs: theirs.organism,
              mine: protein.organism,
            },
          ]}
          onTakeTheirs={() => {
            const there = theirs.numberings.find(({ name }) => name === values.name);
            act.reset();
            setBase(theirs.version);
            reset(valuesOf(theirs, there));
          }}
          onKeepMine={() => save(theirs.version)}
          busyText={busyText}
        />
      ) : (
        <Button kind="primary" submit full busyText={busyText}>
          Save the numbering
        </Button>
      )}
    </Form>
  );
}
