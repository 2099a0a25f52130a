import type { ReactNode } from 'react';
import { ScrollView, View } from 'react-native';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';
import { PageTitle } from '../shell/PageTitle';
import { ProductMark } from '../shell/ProductMark';
import { WallPicture } from './WallPicture';

/** The page around every form of signing in: the product's name, the form, and on a wide window a picture of the work. */
export function AuthFrame({ title, children }: { title: string; children: ReactNode }) {
  const { colours, strokes } = useTheme();
  const { name } = useLayout();
  const t = useWords();
  const wide = name !== 'phone';
  return (
    <View style={{ flex: 1, flexDirection: 'row', backgroundColor: colours.surface }}>
      <PageTitle title={title} />
      {wide ? (
        <View
          style={{
            flex: name === 'wide' ? 1.2 : 0.8,
            backgroundColor: colours.ground,
            borderRightWidth: strokes.hair,
            borderColor: colours.rule,
            overflow: 'hidden',
          }}
        >
          <WallPicture label={t('auth.picture')} />
        </View>
      ) : null}
      <ScrollView
        role="main"
        style={{ flex: 1 }}
        contentContainerStyle={{ flexGrow: 1, justifyContent: wide ? 'center' : 'flex-start', alignItems: 'center' }}
      >
        <View
          style={{
            width: '100%',
            maxWidth: 440,
            padding: space.xl,
            paddingTop: wide ? space.xl : space.xxl,
            gap: space.xxl,
          }}
        >
          <View style={{ gap: space.s }}>
            <View style={{ flexDirection: 'row', alignItems: 'center', gap: space.m }}>
              <ProductMark size={36} />
              <Txt size="title" weight="semibold">
                {t('common.product')}
              </Txt>
            </View>
            <Txt tone="soft">{t('common.tagline')}</Txt>
          </View>
          <View style={{ gap: space.l }}>
            <Txt size="title" weight="semibold" role="heading" level={1}>
              {title}
            </Txt>
            {children}
          </View>
        </View>
      </ScrollView>
    </View>
  );
}
