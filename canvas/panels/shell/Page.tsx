import type { ReactNode } from 'react';
import { ScrollView, View } from 'react-native';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';

/** A scrolling column of sections under a header: the whole width of a phone, a measure of 920 px on larger windows. */
export function Page({ children }: { children: ReactNode }) {
  const wide = useLayout().name !== 'phone';
  return (
    <ScrollView
      // Some pages hold words only: without this the keyboard could not scroll them.
      tabIndex={0}
      style={{ flex: 1 }}
      contentContainerStyle={{
        alignItems: 'center',
        paddingVertical: wide ? space.xl : 0,
        paddingHorizontal: wide ? space.xl : 0,
      }}
    >
      <View style={{ width: '100%', maxWidth: 920, gap: wide ? space.xxl : space.xl, paddingBottom: space.xxl }}>
        {children}
      </View>
    </ScrollView>
  );
}

/** Rows on a surface, edged by hairlines. */
export function Rows({ children, label }: { children: ReactNode; label: string }) {
  const { colours, strokes } = useTheme();
  const wide = useLayout().name !== 'phone';
  return (
    <View
      role="list"
      aria-label={label}
      style={{
        backgroundColor: colours.surface,
        borderColor: colours.rule,
        borderTopWidth: strokes.hair,
        borderLeftWidth: wide ? strokes.hair : 0,
        borderRightWidth: wide ? strokes.hair : 0,
      }}
    >
      {children}
    </View>
  );
}
