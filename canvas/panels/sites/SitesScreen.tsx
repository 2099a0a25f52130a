import { useEffect, useState } from 'react';
import { ScrollView, View } from 'react-native';
import { errorWords } from '../../client/errorWords';
import { useOnline } from '../../client/online';
import { keepPageFiles } from '../../client/pageFiles';
import { useSites } from '../../client/sites';
import { Button } from '../../ui/Button';
import { Header } from '../../ui/Header';
import { IconButton } from '../../ui/IconButton';
import { Empty, Failed, Loading, Offline } from '../../ui/States';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';
import { AccountDialog, fetchSiteScreens, NewSiteDialog } from '../shell/lazyScreens';
import { PageTitle } from '../shell/PageTitle';
import { Paper } from '../shell/Paper';
import { SiteRow } from './SiteRow';

const QUIET_MS = 1500;

/** Every site that the person belongs to, the one changed last first. */
export function SitesScreen() {
  const t = useWords();
  const sites = useSites();
  const online = useOnline();
  const { colours, strokes } = useTheme();
  const wide = useLayout().name !== 'phone';
  const [open, setOpen] = useState<'none' | 'new' | 'account'>('none');
  const listed = sites.data !== undefined;
  useEffect(() => {
    if (!listed) return;
    // Once the list stands and the page is quiet: what opening a site needs, also where there is no signal.
    const timer = setTimeout(() => keepPageFiles(fetchSiteScreens()), QUIET_MS);
    return () => clearTimeout(timer);
  }, [listed]);
  const add = (kind: 'filled' | 'outline') => (
    <Button kind={kind} label={t('sites.add')} onPress={() => setOpen('new')} />
  );

  return (
    <Paper>
      <View role="main" style={{ flex: 1, minHeight: 0 }}>
        <PageTitle title={t('sites.title')} />
        <Header
          title={t('sites.title')}
          subtitle={sites.data && sites.data.length > 0 ? t('sites.count', { count: sites.data.length }) : undefined}
          actions={
            <>
              <IconButton icon="person" label={t('auth.account.open')} onPress={() => setOpen('account')} />
              {sites.data && sites.data.length > 0 ? add('filled') : null}
            </>
          }
        />
        {online ? null : <Offline />}
        {sites.data ? (
          sites.data.length === 0 ? (
            <Empty icon="plan" title={t('sites.empty')} text={t('sites.emptyText')} action={add('filled')} />
          ) : (
            <ScrollView contentContainerStyle={{ alignItems: 'center', paddingVertical: wide ? space.xl : 0 }}>
              <View
                role="list"
                aria-label={t('sites.listLabel')}
                style={{
                  width: '100%',
                  maxWidth: 920,
                  borderColor: colours.rule,
                  borderTopWidth: wide ? strokes.hair : 0,
                  borderLeftWidth: wide ? strokes.hair : 0,
                  borderRightWidth: wide ? strokes.hair : 0,
                }}
              >
                {sites.data.map((site) => (
                  <View role="listitem" key={site.id}>
                    <SiteRow site={site} />
                  </View>
                ))}
              </View>
            </ScrollView>
          )
        ) : sites.isError ? (
          <Failed text={errorWords(t, sites.error)} onRetry={() => void sites.refetch()} />
        ) : (
          <Loading />
        )}
      </View>
      {open === 'new' ? <NewSiteDialog onClose={() => setOpen('none')} /> : null}
      {open === 'account' ? <AccountDialog open onClose={() => setOpen('none')} /> : null}
    </Paper>
  );
}
