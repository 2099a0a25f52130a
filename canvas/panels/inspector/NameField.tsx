import { useState } from 'react';
import { Field } from '../../ui/Field';
import { Txt } from '../../ui/Txt';

export interface NameFieldProps {
  readonly label: string;
  readonly value: string;
  readonly onCommit: (text: string) => void;
  readonly disabled?: boolean;
  readonly numeric?: boolean;
}

/** A name or a plain number, taken on Enter or on leaving. */
export function NameField({ label, value, onCommit, disabled = false, numeric = false }: NameFieldProps) {
  const [text, setText] = useState(value);
  const [of, setOf] = useState(value);
  if (of !== value) {
    setOf(value);
    setText(value);
  }
  if (disabled)
    return (
      <Txt tone="soft">
        {label}
        {': '}
        <Txt>{value}</Txt>
      </Txt>
    );
  const commit = () => {
    if (text.trim() !== value) onCommit(text.trim());
  };
  return (
    <Field
      label={label}
      value={text}
      maxLength={80}
      inputMode={numeric ? 'decimal' : 'text'}
      onChangeText={setText}
      onBlur={commit}
      onSubmitEditing={commit}
      submitBehavior="submit"
    />
  );
}
