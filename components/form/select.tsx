import type { Ref } from 'react';
import ChevronDown from 'lucide-react-native/icons/chevron-down';
import { Icon } from '@/components/ui';
import { controlStyle } from './control-style';
import { Field, type FieldWords } from './field';

export interface SelectOption {
  value: string;
  label: string;
  /** Cannot be chosen; its label says why. */
  off?: boolean;
}

export interface SelectProps extends FieldWords {
  options: readonly SelectOption[];
  value: string;
  onChange: (value: string) => void;
  onBlur?: () => void;
  name?: string;
  ref?: Ref<HTMLSelectElement>;
  /** Shown while nothing is chosen. */
  placeholder?: string;
  required?: boolean;
}

/** The browser's own list: it opens as a wheel on a phone and by the keyboard everywhere. */
export function Select(props: SelectProps) {
  const { label, hint, error, labelEnd, quietLabel, options, value, onChange, placeholder, ...rest } = props;
  return (
    <Field label={label} hint={hint} error={error} labelEnd={labelEnd} quietLabel={quietLabel}>
      {(ids) => (
        <span style={{ position: 'relative', display: 'block' }}>
          <select
            {...ids}
            {...rest}
            value={value}
            className="control"
            style={{ ...controlStyle(Boolean(error)), appearance: 'none', paddingRight: 40 }}
            onChange={(event) => onChange(event.target.value)}
          >
            {placeholder === undefined ? null : <option value="">{placeholder}</option>}
            {options.map((option) => (
              <option key={option.value} value={option.value} disabled={option.off}>
                {option.label}
              </option>
            ))}
          </select>
          <span
            style={{
              position: 'absolute',
              right: 12,
              top: 0,
              bottom: 0,
              display: 'grid',
              placeItems: 'center',
              pointerEvents: 'none',
            }}
          >
            <Icon of={ChevronDown} sizePixels={16} />
          </span>
        </span>
      )}
    </Field>
  );
}
