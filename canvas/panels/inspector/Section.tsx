import type { ReactNode } from 'react';
import { View } from 'react-native';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { Txt } from '../../ui/Txt';

/** Fields that belong together, under a title. */
export function Section({ title, children }: { title: string; children: ReactNode }) {
  const { colours, strokes } = useTheme();
  return (
    <View
      role="group"
      aria-label={title}
      style={{ gap: space.m, paddingBottom: space.l, borderBottomWidth: strokes.hair, borderColor: colours.rule }}
    >
      <Txt size="large" weight="semibold" role="heading" level={3}>
        {title}
      </Txt>
      {children}
    </View>
  );
}
