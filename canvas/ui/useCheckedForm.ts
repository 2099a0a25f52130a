import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm, type DefaultValues, type FieldValues } from 'react-hook-form';
import type { z } from 'zod';

export interface CheckedForm<Input extends FieldValues, Output> {
  /** Makes the schema that the values are checked by, its messages in words; asked for once. */
  readonly schema: () => z.ZodType<Output, Input>;
  readonly initial: DefaultValues<NoInfer<Input>>;
  /** Called with values that passed; must not throw: what went wrong is for the form to show. */
  readonly onSend: (values: Output) => Promise<void>;
}

/**
 * A form that is checked when it is sent: the first field that is wrong takes the focus, and from then on its words go as
 * soon as it is right. It is sent once at a time.
 */
export function useCheckedForm<Input extends FieldValues, Output extends FieldValues>(
  form: CheckedForm<Input, Output>,
) {
  const [resolver] = useState(() => zodResolver(form.schema()));
  const { control, handleSubmit, formState } = useForm({ resolver, defaultValues: form.initial });
  const busy = formState.isSubmitting;
  const send = () => {
    if (!busy) void handleSubmit(form.onSend)();
  };
  return { control, send, busy };
}
