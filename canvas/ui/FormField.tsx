import type { ComponentType } from 'react';
import { useController, type Control, type FieldPath, type FieldValues } from 'react-hook-form';
import { Field, type FieldProps } from './Field';

export interface FormFieldProps<Input extends FieldValues, Output> extends Omit<
  FieldProps,
  'value' | 'onChangeText' | 'onBlur' | 'onSubmitEditing' | 'error' | 'ref'
> {
  readonly form: { readonly control: Control<Input, unknown, Output>; readonly send: () => void };
  readonly name: FieldPath<Input>;
  /** Another look for the line of text, such as a password's. */
  readonly as?: ComponentType<FieldProps>;
}

/** A line of text of a form, by its name; Enter sends the form. */
export function FormField<Input extends FieldValues, Output>(props: FormFieldProps<Input, Output>) {
  const { form, name, as: Shown = Field, ...rest } = props;
  const { field, fieldState } = useController({ control: form.control, name });
  const { ref, value, onChange, onBlur } = field;
  return (
    <Shown
      {...rest}
      ref={ref}
      value={value}
      onChangeText={onChange}
      onBlur={onBlur}
      error={fieldState.error?.message}
      onSubmitEditing={form.send}
    />
  );
}
