import type { ReactNode } from 'react';
import { View, type StyleProp, type ViewStyle } from 'react-native';
import { useTheme } from '../../ui/theme';

/** A whole window of the ground colour. */
export function Paper({ children, style }: { children?: ReactNode; style?: StyleProp<ViewStyle> }) {
  const { colours } = useTheme();
  return <View style={[{ flex: 1, backgroundColor: colours.ground }, style]}>{children}</View>;
}
