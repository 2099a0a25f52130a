import { useId } from 'react';
import { View } from 'react-native';
import { Icon } from './Icon';
import { fonts, radius, space, textSize, touch } from './tokens';
import { Txt } from './Txt';
import { useTheme } from './theme';

export interface PickerOption<Value extends string> {
  readonly value: Value;
  readonly label: string;
}

export interface PickerProps<Value extends string> {
  readonly label: string;
  readonly hideLabel?: boolean;
  readonly options: readonly PickerOption<Value>[];
  readonly value: Value;
  readonly onChange: (value: Value) => void;
  readonly disabled?: boolean;
}

const CHEVRON = 16;

/** One of many: the browser's own list, which a phone opens as its wheel and a keyboard can search. */
export function Picker<Value extends string>(props: PickerProps<Value>) {
  const { label, hideLabel = false, options, value, onChange, disabled = false } = props;
  const { colours } = useTheme();
  const id = useId();
  return (
    <View style={{ gap: space.xs }}>
      {hideLabel ? null : (
        <label htmlFor={id}>
          <Txt weight="medium">{label}</Txt>
        </label>
      )}
      <View>
        <select
          id={id}
          aria-label={hideLabel ? label : undefined}
          value={value}
          disabled={disabled}
          onChange={(event) => {
            const chosen = options.find((option) => option.value === event.target.value);
            if (chosen) onChange(chosen.value);
          }}
          style={{
            minHeight: touch,
            padding: `0 ${space.m + CHEVRON + space.s}px 0 ${space.m}px`,
            appearance: 'none',
            width: '100%',
            borderRadius: radius,
            border: `1px solid ${colours.edge}`,
            backgroundColor: colours.surface,
            color: colours.ink,
            fontFamily: fonts.text,
            fontSize: textSize.large,
            opacity: disabled ? 0.5 : 1,
          }}
        >
          {options.map((option) => (
            <option key={option.value} value={option.value}>
              {option.label}
            </option>
          ))}
        </select>
        <View
          style={{
            position: 'absolute',
            right: space.m,
            top: 0,
            bottom: 0,
            justifyContent: 'center',
            pointerEvents: 'none',
          }}
        >
          <Icon name="down" size={CHEVRON} colour={colours.inkSoft} />
        </View>
      </View>
    </View>
  );
}
