import type { KeyboardEvent, Ref } from 'react';
import { controlStyle } from './control-style';
import { Field, type FieldWords } from './field';

export interface TextAreaProps extends FieldWords {
  value: string;
  onChange: (value: string) => void;
  onBlur?: () => void;
  onKeyDown?: (event: KeyboardEvent<HTMLTextAreaElement>) => void;
  name?: string;
  ref?: Ref<HTMLTextAreaElement>;
  rows?: number;
  placeholder?: string;
  maxLength?: number;
  mono?: boolean;
  required?: boolean;
  readOnly?: boolean;
}

export function TextArea(props: TextAreaProps) {
  const { label, hint, error, labelEnd, quietLabel, value, onChange, mono, rows = 4, ...rest } = props;
  return (
    <Field label={label} hint={hint} error={error} labelEnd={labelEnd} quietLabel={quietLabel}>
      {(ids) => (
        <textarea
          {...ids}
          {...rest}
          rows={rows}
          value={value}
          className="control"
          style={{ ...controlStyle(Boolean(error), mono), resize: 'vertical' }}
          spellCheck={mono ? false : undefined}
          onChange={(event) => onChange(event.target.value)}
        />
      )}
    </Field>
  );
}
