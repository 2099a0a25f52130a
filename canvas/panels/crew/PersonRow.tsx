import type { ReactNode } from 'react';
import { View } from 'react-native';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';

interface PersonRowProps {
  readonly name: string;
  readonly detail: string;
  readonly more: string;
  readonly end: ReactNode;
}

/** A person in the list: on a phone what can be done stands under the name, else at its right. */
export function PersonRow({ name, detail, more, end }: PersonRowProps) {
  const { colours, strokes } = useTheme();
  const phone = useLayout().name === 'phone';
  return (
    <View
      role="listitem"
      style={{
        flexDirection: phone ? 'column' : 'row',
        alignItems: phone ? 'stretch' : 'center',
        gap: phone ? space.s : space.l,
        paddingHorizontal: space.l,
        paddingVertical: space.m,
        borderBottomWidth: strokes.hair,
        borderColor: colours.rule,
      }}
    >
      <View style={{ flex: phone ? undefined : 1, minWidth: 0 }}>
        <Txt size="large" weight="semibold">
          {name}
        </Txt>
        <Txt tone="soft" numberOfLines={1}>
          {detail}
        </Txt>
      </View>
      {phone ? (
        <View style={{ flexDirection: 'row', alignItems: 'center', justifyContent: 'space-between', gap: space.s }}>
          <Txt size="small" tone="soft" style={{ flexShrink: 1 }}>
            {more}
          </Txt>
          {end}
        </View>
      ) : (
        <>
          <Txt size="small" tone="soft" style={{ width: 210 }}>
            {more}
          </Txt>
          <View style={{ minWidth: 200, alignItems: 'flex-end' }}>{end}</View>
        </>
      )}
    </View>
  );
}
