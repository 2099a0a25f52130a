import type { ReactNode } from 'react';
import { View } from 'react-native';
import { Icon } from './Icon';
import type { IconName } from './iconPaths';
import { radius, space } from './tokens';
import { Txt } from './Txt';
import { useTheme } from './theme';

export interface CautionProps {
  readonly text: string;
  /** How grave: `blocked` has no answer, `warning` breaks a rule or can hurt, `note` is worth knowing. */
  readonly weight?: 'blocked' | 'warning' | 'note';
  /** Without its tinted ground, inside a line of other words. */
  readonly bare?: boolean;
  readonly children?: ReactNode;
}

const icons: Readonly<Record<'blocked' | 'warning' | 'note', IconName>> = {
  blocked: 'blocked',
  warning: 'warning',
  note: 'info',
};

/** Something to look out for: always an icon and words, never colour alone. */
export function Caution({ text, weight = 'warning', bare = false, children }: CautionProps) {
  const { colours } = useTheme();
  const note = weight === 'note';
  return (
    <View
      style={[
        { flexDirection: 'row', gap: space.s, alignItems: 'flex-start' },
        bare
          ? null
          : {
              padding: space.m,
              borderRadius: radius,
              backgroundColor: note ? colours.hover : colours.cautionTint,
            },
      ]}
    >
      <Icon name={icons[weight]} size={20} colour={note ? colours.inkSoft : colours.caution} />
      <View style={{ flexShrink: 1, flexGrow: 1, gap: space.xs }}>
        <Txt tone={note ? 'soft' : 'caution'} weight={note ? 'regular' : 'medium'}>
          {text}
        </Txt>
        {children}
      </View>
    </View>
  );
}
