import { useRouter } from 'expo-router';
import type { ReactNode } from 'react';
import { View } from 'react-native';
import { ApiError } from '../../client/api';
import { errorWords } from '../../client/errorWords';
import { useSite } from '../../client/sites';
import { Button } from '../../ui/Button';
import { Empty, Failed, Loading } from '../../ui/States';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';
import { Paper } from './Paper';
import { SiteBar, SiteRail } from './SiteNav';
import { useNavShown } from './withoutNav';

/** Around every screen of a site: nothing before it is known that the person belongs to it, then the bar or the rail. */
export function SiteFrame({ siteId, children }: { siteId: string; children: ReactNode }) {
  const t = useWords();
  const router = useRouter();
  const site = useSite(siteId);
  const { colours } = useTheme();
  const phone = useLayout().name === 'phone';
  const navShown = useNavShown();
  const toSites = <Button label={t('common.nav.allSites')} onPress={() => router.replace('/')} />;

  const refused = site.error instanceof ApiError ? site.error.code : null;
  if (refused === 'notFound' || refused === 'notAllowed' || refused === 'badInput')
    return (
      <Paper>
        <Empty icon="plan" title={t('sites.gone.title')} text={t('sites.gone.text')} action={toSites} />
      </Paper>
    );
  if (!site.data)
    return (
      <Paper>
        {site.isError ? <Failed text={errorWords(t, site.error)} onRetry={() => void site.refetch()} /> : <Loading />}
      </Paper>
    );

  return (
    <View style={{ flex: 1, flexDirection: phone ? 'column' : 'row', backgroundColor: colours.ground }}>
      {phone ? null : <SiteRail siteId={siteId} />}
      <View role="main" style={{ flex: 1, minWidth: 0, minHeight: 0 }}>
        {children}
      </View>
      {phone && navShown ? <SiteBar siteId={siteId} /> : null}
    </View>
  );
}
