import { useId, type Ref } from 'react';
import { TextInput, View, type TextInputProps } from 'react-native';
import { Icon } from './Icon';
import { fonts, radius, space, textSize } from './tokens';
import { Txt } from './Txt';
import { useTheme } from './theme';

export interface FieldProps extends Omit<TextInputProps, 'style' | 'value' | 'onChangeText'> {
  readonly label: string;
  readonly value: string;
  readonly onChangeText: (text: string) => void;
  readonly hint?: string;
  readonly error?: string;
  readonly ref?: Ref<TextInput>;
}

/** A line of text with its label above and what is wrong with it below. */
export function Field({ label, hint, error, ref, multiline, ...input }: FieldProps) {
  const { colours } = useTheme();
  const id = useId();
  const below = error ?? hint;
  const described = { 'aria-invalid': error ? true : undefined, 'aria-describedby': below ? `${id}-below` : undefined };
  return (
    <View style={{ gap: space.xs }}>
      <Txt size="body" weight="medium" nativeID={`${id}-label`}>
        {label}
      </Txt>
      <TextInput
        {...input}
        {...(described as object)}
        ref={ref}
        multiline={multiline}
        aria-labelledby={`${id}-label`}
        style={{
          minHeight: multiline ? 96 : 52,
          paddingHorizontal: space.m,
          paddingVertical: space.m,
          borderRadius: radius,
          borderWidth: error ? 2 : 1,
          // The thicker edge must not push the text about; the focus has its own ring.
          margin: error ? 0 : 1,
          borderColor: error ? colours.caution : colours.edge,
          backgroundColor: colours.surface,
          color: colours.ink,
          fontFamily: fonts.text,
          fontSize: textSize.large,
        }}
      />
      {below ? (
        <View
          nativeID={`${id}-below`}
          role={error ? 'alert' : undefined}
          style={{ flexDirection: 'row', gap: space.xs, alignItems: 'center' }}
        >
          {error ? <Icon name="warning" size={18} colour={colours.caution} /> : null}
          <Txt
            size="body"
            tone={error ? 'caution' : 'soft'}
            weight={error ? 'medium' : 'regular'}
            style={{ flexShrink: 1 }}
          >
            {below}
          </Txt>
        </View>
      ) : null}
    </View>
  );
}
