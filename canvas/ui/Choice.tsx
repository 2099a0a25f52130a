import { useId, useRef } from 'react';
import { Pressable, View } from 'react-native';
import type { PressState } from './Button';
import { Icon } from './Icon';
import type { IconName } from './iconPaths';
import { radius, space, touch } from './tokens';
import { Txt } from './Txt';
import { useTheme } from './theme';

export interface ChoiceOption<Value extends string> {
  readonly value: Value;
  readonly label: string;
  readonly icon?: IconName;
  readonly disabled?: boolean;
}

export interface ChoiceProps<Value extends string> {
  readonly label: string;
  /** Keep the label for readers only, where the screen already says it. */
  readonly hideLabel?: boolean;
  readonly options: readonly ChoiceOption<Value>[];
  readonly value: Value;
  readonly onChange: (value: Value) => void;
}

const steps: Readonly<Record<string, number>> = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 };

/** One of a few, side by side: a group of radio buttons moved through by the arrow keys. */
export function Choice<Value extends string>(props: ChoiceProps<Value>) {
  const { label, hideLabel = false, options, value, onChange } = props;
  const { colours } = useTheme();
  const id = useId();
  const buttons = useRef(new Map<string, { focus: () => void } | null>());

  function move(from: number, key: string): boolean {
    const step = steps[key];
    if (step === undefined) return false;
    for (let i = 1; i <= options.length; i++) {
      const option = options[(from + step * i + options.length * i) % options.length];
      if (option && !option.disabled) {
        onChange(option.value);
        buttons.current.get(option.value)?.focus();
        return true;
      }
    }
    return false;
  }

  return (
    <View style={{ gap: space.xs }}>
      {hideLabel ? null : (
        <Txt weight="medium" nativeID={id}>
          {label}
        </Txt>
      )}
      <View
        role="radiogroup"
        aria-label={hideLabel ? label : undefined}
        aria-labelledby={hideLabel ? undefined : id}
        style={{ flexDirection: 'row', borderRadius: radius, borderWidth: 1, borderColor: colours.edge }}
      >
        {options.map((option, index) => {
          const on = option.value === value;
          return (
            <Pressable
              key={option.value}
              ref={(node) => {
                buttons.current.set(option.value, node as { focus: () => void } | null);
              }}
              role="radio"
              aria-checked={on}
              aria-label={option.label}
              aria-disabled={option.disabled}
              disabled={option.disabled}
              tabIndex={on ? 0 : -1}
              onPress={() => onChange(option.value)}
              {...({
                onKeyDown: (event: { key: string; preventDefault: () => void }) => {
                  if (move(index, event.key)) event.preventDefault();
                },
              } as object)}
              style={({ hovered }: PressState) => ({
                flexGrow: 1,
                flexShrink: 1,
                minHeight: touch,
                flexDirection: 'row',
                gap: space.s,
                alignItems: 'center',
                justifyContent: 'center',
                paddingHorizontal: space.m,
                opacity: option.disabled ? 0.5 : 1,
                borderLeftWidth: index === 0 ? 0 : 1,
                borderColor: colours.edge,
                borderRadius: radius - 1,
                backgroundColor: on ? colours.earthDeep : hovered ? colours.hover : colours.surface,
              })}
            >
              {option.icon ? (
                <Icon name={option.icon} size={20} colour={on ? colours.onEarthDeep : colours.ink} />
              ) : null}
              <Txt weight={on ? 'semibold' : 'medium'} tone={on ? 'onAccent' : 'ink'} align="center" numberOfLines={1}>
                {option.label}
              </Txt>
            </Pressable>
          );
        })}
      </View>
    </View>
  );
}
