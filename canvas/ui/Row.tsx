import type { ReactNode } from 'react';
import { Pressable, View, type ViewStyle } from 'react-native';
import type { PressState } from './Button';
import { Icon } from './Icon';
import type { IconName } from './iconPaths';
import { space } from './tokens';
import { Txt } from './Txt';
import { useTheme } from './theme';

export interface RowProps {
  readonly title: string;
  readonly subtitle?: string;
  readonly icon?: IconName;
  /** Before the words: a picture or a letter. */
  readonly start?: ReactNode;
  /** After the words: a number, a state, buttons. */
  readonly end?: ReactNode;
  /** Under the words. */
  readonly children?: ReactNode;
  readonly selected?: boolean;
  readonly onPress?: () => void;
  /** Read aloud instead of title and subtitle. */
  readonly spoken?: string;
}

/** A row of a list, divided from the next by a hairline; pressed as a whole when it leads somewhere. */
export function Row({ title, subtitle, icon, start, end, children, selected, onPress, spoken }: RowProps) {
  const { colours, strokes } = useTheme();
  const box: ViewStyle = {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.l,
    minHeight: 60,
    paddingHorizontal: space.l,
    paddingVertical: space.m,
    borderBottomWidth: strokes.hair,
    borderColor: colours.rule,
  };
  const inside = (
    <>
      {icon ? <Icon name={icon} colour={selected ? colours.earthDeep : colours.inkSoft} /> : null}
      {start}
      <View style={{ flex: 1, minWidth: 0, gap: 2 }}>
        <Txt size="large" weight={selected ? 'semibold' : 'medium'}>
          {title}
        </Txt>
        {subtitle ? <Txt tone="soft">{subtitle}</Txt> : null}
        {children}
      </View>
      {end}
    </>
  );
  const ground = selected ? colours.selected : colours.surface;
  if (!onPress) return <View style={[box, { backgroundColor: ground }]}>{inside}</View>;
  return (
    <Pressable
      role="button"
      aria-label={spoken}
      {...(selected === undefined ? null : ({ 'aria-pressed': selected } as object))}
      onPress={onPress}
      style={({ pressed, hovered }: PressState) => [
        box,
        { backgroundColor: selected ? colours.selected : pressed || hovered ? colours.hover : ground },
      ]}
    >
      {inside}
      {end ? null : <Icon name="forward" size={18} colour={colours.inkSoft} />}
    </Pressable>
  );
}
