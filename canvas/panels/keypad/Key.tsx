import type { ReactNode } from 'react';
import { Pressable, type TextStyle } from 'react-native';
import type { PressState } from '../../ui/Button';
import { Icon } from '../../ui/Icon';
import { radius } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';

export interface KeyProps {
  /** What is written on it; a fraction as `5/8`. */
  readonly face: string;
  readonly spoken: string;
  readonly onPress: () => void;
  readonly height: number;
  readonly on?: boolean;
  readonly disabled?: boolean;
}

/** One key of the tape keypad. */
export function Key({ face, spoken, onPress, height, on = false, disabled = false }: KeyProps) {
  const { colours, strokes } = useTheme();
  return (
    <Pressable
      role="button"
      aria-label={spoken}
      aria-disabled={disabled}
      {...(on ? ({ 'aria-pressed': true } as object) : null)}
      disabled={disabled}
      onPress={onPress}
      style={({ pressed, hovered }: PressState) => ({
        flex: 1,
        minWidth: 0,
        height,
        alignItems: 'center',
        justifyContent: 'center',
        borderRadius: radius,
        borderWidth: strokes.hair,
        borderColor: on ? colours.earthDeep : colours.rule,
        backgroundColor: on ? colours.earthDeep : pressed || hovered ? colours.hover : colours.surface,
        opacity: disabled ? 0.45 : 1,
      })}
    >
      {face === 'erase' ? (
        <Icon name="eraseLast" size={26} />
      ) : (
        <Txt numeric size="row" weight="semibold" tone={on ? 'onAccent' : 'ink'}>
          <Face text={face} />
        </Txt>
      )}
    </Pressable>
  );
}

function Face({ text }: { text: string }): ReactNode {
  const match = /^(\+?)(\d+\/\d+)$/.exec(text);
  if (!match) return text;
  return (
    <>
      {match[1]}
      <Txt numeric size="row" weight="semibold" style={fraction}>
        {match[2]}
      </Txt>
    </>
  );
}

/** `frac` covers the fraction alone; its colour is the key's. */
const fraction = { fontFeatureSettings: '"frac"', fontVariant: [], color: 'inherit' } as unknown as TextStyle;
