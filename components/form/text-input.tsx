import type { HTMLInputAutoCompleteAttribute, Ref } from 'react';
import { controlStyle } from './control-style';
import { Field, type FieldWords } from './field';

export interface TextInputProps extends FieldWords {
  value: string;
  onChange: (value: string) => void;
  onBlur?: () => void;
  name?: string;
  ref?: Ref<HTMLInputElement>;
  type?: 'text' | 'email' | 'password' | 'search' | 'url';
  inputMode?: 'text' | 'numeric' | 'decimal' | 'email' | 'search';
  placeholder?: string;
  autoComplete?: HTMLInputAutoCompleteAttribute;
  autoFocus?: boolean;
  maxLength?: number;
  /** Sequences, numbers and labels. */
  mono?: boolean;
  required?: boolean;
  readOnly?: boolean;
}

export function TextInput(props: TextInputProps) {
  const { label, hint, error, labelEnd, quietLabel, value, onChange, mono, type = 'text', ...rest } = props;
  return (
    <Field label={label} hint={hint} error={error} labelEnd={labelEnd} quietLabel={quietLabel}>
      {(ids) => (
        <input
          {...ids}
          {...rest}
          type={type}
          value={value}
          className="control"
          style={controlStyle(Boolean(error), mono)}
          spellCheck={mono ? false : undefined}
          autoCapitalize={mono ? 'off' : undefined}
          onChange={(event) => onChange(event.target.value)}
        />
      )}
    </Field>
  );
}
