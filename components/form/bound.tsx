import {
  useController,
  type Control,
  type FieldError,
  type FieldPath,
  type FieldPathByValue,
  type FieldValues,
} from 'react-hook-form';
import { Choice, type ChoiceProps } from '@/components/ui';
import { Checkbox, type CheckboxProps } from './checkbox';
import { Select, type SelectProps } from './select';
import { TextArea, type TextAreaProps } from './text-area';
import { TextInput, type TextInputProps } from './text-input';

/** Which field of which form a part fills in. */
interface Binding<Values extends FieldValues, Name extends FieldPath<Values>, Sent> {
  control: Control<Values, unknown, Sent>;
  name: Name;
}

interface TextBinding<Values extends FieldValues, Name extends FieldPath<Values>, Sent> extends Binding<
  Values,
  Name,
  Sent
> {
  /** Said before anything the form finds wrong. */
  error?: string;
  /** Said instead of the schema's words when the form finds the field wrong. */
  wrongWords?: string;
  /** Left empty, it counts as not given. */
  emptyIsNone?: boolean;
}

type FromForm = 'value' | 'onChange' | 'onBlur' | 'name' | 'ref' | 'error';
type TextName<Values extends FieldValues> = FieldPathByValue<Values, string | undefined>;
type Bound<Part, Values extends FieldValues, Name extends FieldPath<Values>, Sent> = Omit<Part, FromForm> &
  TextBinding<Values, Name, Sent>;

/** What is wrong with a field; where it is read as a list, what is wrong first in the list. */
function messageOf(error: FieldError): string | undefined {
  const errors: readonly (FieldError | undefined)[] = Array.isArray(error) ? error : [error];
  return errors.find((one) => one !== undefined)?.message;
}

/** What is written in the field, what becomes of a change, and what is wrong with it. */
function useText<Values extends FieldValues, Name extends FieldPath<Values>, Sent>(
  binding: TextBinding<Values, Name, Sent>,
) {
  const { control, name, emptyIsNone = false, error, wrongWords } = binding;
  const { field, fieldState } = useController({ control, name });
  return {
    name: field.name,
    ref: field.ref,
    onBlur: field.onBlur,
    value: String(field.value ?? ''),
    onChange: (text: string) => field.onChange(emptyIsNone ? text || undefined : text),
    error: error || (fieldState.error && (wrongWords ?? messageOf(fieldState.error))),
  };
}

/** A line of text of a form. */
export function BoundText<Values extends FieldValues, Name extends TextName<Values>, Sent>(
  props: Bound<TextInputProps, Values, Name, Sent>,
) {
  const { control, name, emptyIsNone, error, wrongWords, ...part } = props;
  return <TextInput {...part} {...useText({ control, name, emptyIsNone, error, wrongWords })} />;
}

/** A longer text of a form. */
export function BoundArea<Values extends FieldValues, Name extends TextName<Values>, Sent>(
  props: Bound<TextAreaProps, Values, Name, Sent>,
) {
  const { control, name, emptyIsNone, error, wrongWords, ...part } = props;
  return <TextArea {...part} {...useText({ control, name, emptyIsNone, error, wrongWords })} />;
}

/** One of a list, in a form. */
export function BoundSelect<Values extends FieldValues, Name extends TextName<Values>, Sent>(
  props: Bound<SelectProps, Values, Name, Sent>,
) {
  const { control, name, emptyIsNone, error, wrongWords, ...part } = props;
  return <Select {...part} {...useText({ control, name, emptyIsNone, error, wrongWords })} />;
}

/** Yes or no, in a form. */
export function BoundCheckbox<
  Values extends FieldValues,
  Name extends FieldPathByValue<Values, boolean | undefined>,
  Sent,
>({ control, name, ...part }: Omit<CheckboxProps, FromForm> & Binding<Values, Name, Sent>) {
  const { field } = useController({ control, name });
  return (
    <Checkbox
      {...part}
      name={field.name}
      ref={field.ref}
      onBlur={field.onBlur}
      value={Boolean(field.value)}
      onChange={field.onChange}
    />
  );
}

/** One of a few cards, in a form. */
export function BoundChoice<Values extends FieldValues, Name extends TextName<Values>, Sent>({
  control,
  name,
  ...part
}: Omit<ChoiceProps, FromForm> & Binding<Values, Name, Sent>) {
  const { field } = useController({ control, name });
  return <Choice {...part} value={field.value} onChange={field.onChange} />;
}
