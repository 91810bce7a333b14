/*
 * What is filled in. Each part brings its label, hint and error, and takes a Controller's field as it is:
 *   <Controller control={control} name="email"
 *     render={({ field, fieldState }) => <TextInput label="E-mail" {...field} error={fieldState.error?.message} />} />
 * All but FileDrop: label hint? error? labelEnd? quietLabel? value onChange(value) onBlur? name? ref?
 *   TextInput   type? inputMode? placeholder? autoComplete? autoFocus? maxLength? mono? required? readOnly?
 *   TextArea    rows? placeholder? maxLength? mono? required? readOnly? onKeyDown?
 *   Select      options[{ value, label, off? }] placeholder? required?
 *   Checkbox    label hint? value: boolean onChange(value)
 *   FileDrop    title hint? action? accept? onFile(file) error? busyText? offReason? buttonKind? more?
 *   Field       children(ids): for a control of one's own; spread the ids on it
 */
export { Field, type ControlIds, type FieldProps, type FieldWords } from './field';
export { TextInput, type TextInputProps } from './text-input';
export { TextArea, type TextAreaProps } from './text-area';
export { Select, type SelectOption, type SelectProps } from './select';
export { Checkbox, type CheckboxProps } from './checkbox';
export { FileDrop, type FileDropProps } from './file-drop';
