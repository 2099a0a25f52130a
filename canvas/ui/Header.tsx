import type { ReactNode } from 'react';
import { View } from 'react-native';
import { Icon } from './Icon';
import { IconButton } from './IconButton';
import type { IconName } from './iconPaths';
import { space } from './tokens';
import { Txt } from './Txt';
import { useTheme } from './theme';
import { useWords } from './words';

export interface HeaderProps {
  readonly title: string;
  readonly subtitle?: string;
  /** Before the second line, where it says that something is amiss. */
  readonly subtitleIcon?: IconName;
  /** Buttons at the right; one filled at most. */
  readonly actions?: ReactNode;
  readonly onBack?: () => void;
  /** Read aloud for the back arrow: where it leads. */
  readonly backLabel?: string;
}

/** The top of every screen: what it is, a quiet second line, and its actions. */
export function Header({ title, subtitle, subtitleIcon, actions, onBack, backLabel }: HeaderProps) {
  const { colours, strokes } = useTheme();
  const t = useWords();
  return (
    <View
      style={{
        flexDirection: 'row',
        alignItems: 'center',
        gap: space.m,
        minHeight: 68,
        paddingLeft: onBack ? space.xs : space.l,
        paddingRight: space.l,
        paddingVertical: space.s,
        backgroundColor: colours.surface,
        borderBottomWidth: strokes.hair,
        borderColor: colours.rule,
      }}
    >
      {onBack ? <IconButton icon="back" label={backLabel ?? t('common.back')} onPress={onBack} /> : null}
      <View style={{ flex: 1, minWidth: 0 }}>
        <Txt size="large" weight="semibold" role="heading" level={1} numberOfLines={1}>
          {title}
        </Txt>
        {subtitle ? (
          <View role="status" style={{ flexDirection: 'row', alignItems: 'center', gap: space.xs }}>
            {subtitleIcon ? <Icon name={subtitleIcon} size={16} colour={colours.inkSoft} /> : null}
            <Txt size="small" tone="soft" numberOfLines={1} style={{ flexShrink: 1 }}>
              {subtitle}
            </Txt>
          </View>
        ) : null}
      </View>
      {actions ? <View style={{ flexDirection: 'row', alignItems: 'center', gap: space.s }}>{actions}</View> : null}
    </View>
  );
}
