import { Pressable, View, type StyleProp, type ViewStyle } from 'react-native';
import { Icon } from './Icon';
import type { IconName } from './iconPaths';
import { Spinner } from './Spinner';
import { radius, space, toneColour, touch, type Colours, type TextSizeName, type Tone } from './tokens';
import { Txt } from './Txt';
import { useTheme } from './theme';

export type ButtonKind = 'filled' | 'outline' | 'quiet';

export interface ButtonProps {
  /** What it does: shown, and read aloud. */
  readonly label: string;
  /** Read aloud instead of the label, where the label alone says too little. */
  readonly spoken?: string;
  readonly onPress?: () => void;
  /** One filled button a screen. */
  readonly kind?: ButtonKind;
  readonly tone?: 'accent' | 'caution';
  readonly icon?: IconName;
  readonly busy?: boolean;
  readonly disabled?: boolean;
  readonly size?: TextSizeName;
  /** For a switch: whether it is on. */
  readonly pressed?: boolean;
  readonly style?: StyleProp<ViewStyle>;
  readonly testID?: string;
}

/** What a browser adds to a press: whether the pointer is over it. */
export interface PressState {
  readonly pressed: boolean;
  readonly hovered?: boolean;
}

function look(colours: Colours, kind: ButtonKind, tone: 'accent' | 'caution', on: boolean, under: boolean): ViewStyle {
  const deep = tone === 'caution' ? colours.caution : colours.earthDeep;
  if (kind === 'filled' || on) {
    const fill = under ? colours.earthPressed : deep;
    return { backgroundColor: fill, borderColor: fill };
  }
  const backgroundColor = under ? colours.hover : 'transparent';
  return { backgroundColor, borderColor: kind === 'outline' ? deep : 'transparent' };
}

/** A button with words, and an icon before them if given. At least 48 px high. */
export function Button(props: ButtonProps) {
  const { label, spoken, onPress, kind = 'outline', tone = 'accent', icon, size = 'large', pressed, testID } = props;
  const { busy = false, disabled = false, style } = props;
  const { colours } = useTheme();
  const off = disabled || busy;
  const textTone: Tone = kind === 'filled' || pressed ? 'onAccent' : tone;
  return (
    <Pressable
      role="button"
      aria-label={spoken ?? label}
      aria-disabled={off}
      aria-busy={busy}
      {...(pressed === undefined ? null : ({ 'aria-pressed': pressed } as object))}
      disabled={off}
      onPress={onPress}
      testID={testID}
      style={({ pressed: down, hovered }: PressState) => [
        shape,
        look(colours, kind, tone, pressed === true, down || hovered === true),
        disabled && !busy && faded,
        style,
      ]}
    >
      {busy ? (
        <Spinner size={20} colour={toneColour(colours, textTone)} />
      ) : icon ? (
        <Icon name={icon} size={22} colour={toneColour(colours, textTone)} />
      ) : null}
      <View style={{ flexShrink: 1 }}>
        <Txt size={size} weight="medium" tone={textTone} align="center" numberOfLines={2}>
          {label}
        </Txt>
      </View>
    </Pressable>
  );
}

const shape: ViewStyle = {
  minHeight: touch,
  minWidth: touch,
  paddingHorizontal: space.l,
  paddingVertical: space.s,
  borderWidth: 1.5,
  borderRadius: radius,
  flexDirection: 'row',
  alignItems: 'center',
  justifyContent: 'center',
  gap: space.s,
};

const faded: ViewStyle = { opacity: 0.5 };
