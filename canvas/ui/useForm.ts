import { useRef, useState } from 'react';
import type { TextInput } from 'react-native';

type Checks<Values> = { readonly [Name in keyof Values]?: (value: Values[Name]) => true | string };

export interface FormSpec<Values> {
  readonly initial: Values;
  /** What is wrong with a value, in words, or true. */
  readonly checks?: Checks<Values>;
  /** Called with values that pass every check. May throw: the form is then ready to be sent again. */
  readonly onSubmit: (values: Values) => Promise<void>;
}

type TextNames<Values> = { [Name in keyof Values]: Values[Name] extends string ? Name : never }[keyof Values];

/**
 * A small form: its values, what is wrong with each once it was sent, and sending it once at a time. On sending, the first
 * field that is wrong takes the focus; from then on its words go as soon as it is right.
 */
export function useForm<Values extends Record<string, string>>({ initial, checks = {}, onSubmit }: FormSpec<Values>) {
  const [values, setValues] = useState(initial);
  const [sent, setSent] = useState(false);
  const [busy, setBusy] = useState(false);
  const inputs = useRef<Partial<Record<keyof Values, TextInput | null>>>({});

  function errorOf<Name extends keyof Values>(name: Name): string | undefined {
    const verdict = checks[name]?.(values[name]) ?? true;
    return verdict === true ? undefined : verdict;
  }

  function set<Name extends keyof Values>(name: Name, value: Values[Name]): void {
    setValues((before) => ({ ...before, [name]: value }));
  }

  async function submit(): Promise<void> {
    if (busy) return;
    setSent(true);
    const wrong = Object.keys(values).find((name) => errorOf(name) !== undefined);
    if (wrong !== undefined) {
      inputs.current[wrong]?.focus();
      return;
    }
    setBusy(true);
    try {
      await onSubmit(values);
    } finally {
      setBusy(false);
    }
  }

  /** What a text field needs, by its name. */
  function field(name: TextNames<Values>) {
    return {
      ref: (input: TextInput | null) => {
        inputs.current[name] = input;
      },
      value: values[name] as string,
      onChangeText: (text: string) => set(name, text as Values[typeof name]),
      error: sent ? errorOf(name) : undefined,
      onSubmitEditing: () => void submit(),
    };
  }

  return { values, set, field, submit: () => void submit(), busy };
}
