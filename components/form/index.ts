/*
 * What is filled in. Each part brings its label, hint and error.
 *   TextInput   type? inputMode? placeholder? autoComplete? autoFocus? maxLength? mono? required? readOnly?
 *   TextArea    rows? placeholder? maxLength? mono? required? readOnly? onKeyDown?
 *   Select      options[{ value, label, off? }] placeholder? required?
 *   Checkbox    label hint? value: boolean onChange(value)
 *   FileDrop    title hint? action? accept? onFile(file) error? busyText? offReason? buttonKind? more?
 * All but FileDrop: label hint? error? labelEnd? quietLabel? value onChange(value) onBlur? name? ref?
 * In a form they are bound to a field, which gives value, onChange and error:
 *   <BoundText control={control} name="email" label="E-mail" required />
 *   BoundText, BoundArea, BoundSelect, BoundCheckbox, BoundChoice; wrongWords? (instead of the schema's) emptyIsNone?
 *   Form        onSubmit() gap?
 */
export { TextInput } from './text-input';
export { TextArea } from './text-area';
export { Select } from './select';
export { FileDrop } from './file-drop';
export { BoundArea, BoundCheckbox, BoundChoice, BoundSelect, BoundText } from './bound';
export { Form } from './form';
