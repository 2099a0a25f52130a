import { Pressable, type StyleProp, type ViewStyle } from 'react-native';
import type { PressState } from './Button';
import { Icon } from './Icon';
import type { IconName } from './iconPaths';
import { radius, touch } from './tokens';
import { useTheme } from './theme';

export interface IconButtonProps {
  readonly icon: IconName;
  /** What it does, read aloud and shown as a hint. */
  readonly label: string;
  readonly onPress?: () => void;
  readonly kind?: 'filled' | 'outline' | 'quiet';
  readonly disabled?: boolean;
  /** For a switch: whether it is on. */
  readonly pressed?: boolean;
  readonly style?: StyleProp<ViewStyle>;
  readonly testID?: string;
}

/** A 48 px button with only an icon. */
export function IconButton(props: IconButtonProps) {
  const { icon, label, onPress, kind = 'quiet', disabled = false, pressed, style, testID } = props;
  const { colours } = useTheme();
  const filled = kind === 'filled' || pressed === true;
  return (
    <Pressable
      role="button"
      aria-label={label}
      aria-disabled={disabled}
      {...({ title: label, 'aria-pressed': pressed } as object)}
      disabled={disabled}
      onPress={onPress}
      testID={testID}
      style={({ pressed: down, hovered }: PressState) => [
        shape,
        {
          backgroundColor: filled ? colours.earthDeep : down || hovered ? colours.hover : 'transparent',
          borderColor: kind === 'outline' && !filled ? colours.earthDeep : 'transparent',
          opacity: disabled ? 0.4 : 1,
        },
        style,
      ]}
    >
      <Icon name={icon} colour={filled ? colours.onEarthDeep : kind === 'outline' ? colours.earthDeep : colours.ink} />
    </Pressable>
  );
}

const shape: ViewStyle = {
  width: touch,
  height: touch,
  borderWidth: 1.5,
  borderRadius: radius,
  alignItems: 'center',
  justifyContent: 'center',
};
