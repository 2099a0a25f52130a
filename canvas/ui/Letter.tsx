import { View } from 'react-native';
import { radius } from './tokens';
import { Txt } from './Txt';
import { useTheme } from './theme';

/** A corner's or pole's letter in its frame; solid steel when it is the selected one. */
export function Letter({ letter, selected = false, size = 36 }: { letter: string; selected?: boolean; size?: number }) {
  const { colours } = useTheme();
  return (
    <View
      style={{
        minWidth: size,
        height: size,
        paddingHorizontal: 4,
        alignItems: 'center',
        justifyContent: 'center',
        borderRadius: radius,
        borderWidth: 1.5,
        borderColor: colours.steel,
        backgroundColor: selected ? colours.steel : colours.surface,
      }}
    >
      <Txt numeric size="table" weight="semibold" style={{ color: selected ? colours.onTag : colours.ink }}>
        {letter}
      </Txt>
    </View>
  );
}
