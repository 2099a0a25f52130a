import { Link, type Href } from 'expo-router';
import { View } from 'react-native';
import { Icon } from '../../ui/Icon';
import type { IconName } from '../../ui/iconPaths';
import { Txt } from '../../ui/Txt';
import { useTheme } from '../../ui/theme';

export interface NavItemProps {
  readonly href: Href;
  readonly label: string;
  readonly icon: IconName;
  readonly active: boolean;
  /** Which edge is lit: the bar's top, or the rail's left. */
  readonly edge: 'top' | 'left';
}

/** One part of the site in the bar or the rail. */
export function NavItem({ href, label, icon, active, edge }: NavItemProps) {
  const { colours } = useTheme();
  const lit = active ? colours.earthDeep : 'transparent';
  const top = edge === 'top';
  return (
    <Link
      href={href}
      aria-current={active ? 'page' : undefined}
      style={{ display: 'flex', flexGrow: top ? 1 : 0, flexBasis: top ? 0 : 'auto', textDecorationLine: 'none' }}
    >
      <View
        style={{
          flex: 1,
          minHeight: top ? 64 : 68,
          gap: 4,
          alignItems: 'center',
          justifyContent: 'center',
          borderTopWidth: top ? 3 : 0,
          borderLeftWidth: top ? 0 : 3,
          paddingRight: top ? 0 : 3,
          borderColor: lit,
          backgroundColor: active && !top ? colours.ground : 'transparent',
        }}
      >
        <Icon name={icon} colour={active ? colours.earthDeep : colours.inkSoft} />
        <Txt size="small" weight={active ? 'semibold' : 'medium'} tone={active ? 'accent' : 'soft'}>
          {label}
        </Txt>
      </View>
    </Link>
  );
}
