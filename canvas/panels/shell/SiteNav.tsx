import { Link, usePathname } from 'expo-router';
import { ScrollView, View } from 'react-native';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { useWords } from '../../ui/words';
import { NavItem } from './NavItem';
import { barPartOf, partOf, partsInBar, siteParts } from './parts';
import { ProductMark } from './ProductMark';

/** The bar at the bottom of a phone. */
export function SiteBar({ siteId }: { siteId: string }) {
  const t = useWords();
  const { colours, strokes } = useTheme();
  const lit = barPartOf(partOf(usePathname()));
  return (
    <View
      role="navigation"
      aria-label={t('common.nav.label')}
      style={[
        {
          flexDirection: 'row',
          backgroundColor: colours.surface,
          borderTopWidth: strokes.hair,
          borderColor: colours.rule,
        },
        // Clear of a phone's home strip.
        { paddingBottom: 'env(safe-area-inset-bottom)' } as object,
      ]}
    >
      {partsInBar().map(({ part, words, icon }) => (
        <NavItem
          key={part}
          href={`/sites/${siteId}/${part}`}
          label={t(`common.nav.${words}`)}
          icon={icon}
          active={part === lit}
          edge="top"
        />
      ))}
    </View>
  );
}

/** The rail at the left of a tablet or a wide window. */
export function SiteRail({ siteId }: { siteId: string }) {
  const t = useWords();
  const { colours, strokes } = useTheme();
  const lit = partOf(usePathname());
  return (
    <View
      role="navigation"
      aria-label={t('common.nav.label')}
      style={{
        width: 88,
        backgroundColor: colours.surface,
        borderRightWidth: strokes.hair,
        borderColor: colours.rule,
      }}
    >
      <Link
        href="/"
        aria-label={t('common.nav.allSites')}
        style={{
          display: 'flex',
          justifyContent: 'center',
          alignItems: 'center',
          height: 68,
          borderBottomWidth: strokes.hair,
          borderStyle: 'solid',
          borderColor: colours.rule,
        }}
      >
        <ProductMark size={36} />
      </Link>
      <ScrollView contentContainerStyle={{ flexGrow: 1, paddingVertical: space.s }}>
        {siteParts.map(({ part, words, icon }) => (
          <View key={part} style={part === 'more' ? { marginTop: 'auto' } : null}>
            <NavItem
              href={`/sites/${siteId}/${part}`}
              label={t(`common.nav.${words}`)}
              icon={icon}
              active={part === lit}
              edge="left"
            />
          </View>
        ))}
      </ScrollView>
    </View>
  );
}
