import { useRouter } from 'expo-router';
import { useState } from 'react';
import { View } from 'react-native';
import { may } from '../../../model/contracts/common';
import { useSite } from '../../client/sites';
import { Header } from '../../ui/Header';
import { Row } from '../../ui/Row';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';
import { Page, Rows } from '../shell/Page';
import { PageTitle } from '../shell/PageTitle';
import { siteParts } from '../shell/parts';
import { Section } from '../shell/Section';
import { AccountDialog } from '../sites/AccountDialog';
import { ThemeChoice } from '../sites/ThemeChoice';
import { Cautions } from './Cautions';
import { DeleteSiteDialog } from './DeleteSiteDialog';
import { RenameSiteDialog } from './RenameSiteDialog';
import { SheetsList } from './SheetsList';

/** What has no room in the bar: on a phone the site's other parts, and everywhere the sheets, the screen and the account. */
export function MoreScreen({ siteId }: { siteId: string }) {
  const t = useWords();
  const router = useRouter();
  const site = useSite(siteId).data;
  const { colours } = useTheme();
  const phone = useLayout().name === 'phone';
  const [open, setOpen] = useState<'none' | 'account' | 'rename' | 'delete'>('none');
  const close = () => setOpen('none');
  const manages = site !== undefined && may(site.role, 'manageSite');
  const others = siteParts.filter(({ part }) => part === 'takeoff' || part === 'revisions' || part === 'crew');
  const inset = phone ? space.l : 0;

  return (
    <View style={{ flex: 1, backgroundColor: colours.ground }}>
      <PageTitle title={`${t('sites.more.title')} · ${site?.name ?? ''}`} />
      <Header title={t('sites.more.title')} subtitle={site?.name} />
      <Page>
        {phone ? (
          <Rows label={t('common.nav.label')}>
            {others.map(({ part, words, icon }) => (
              <View role="listitem" key={part}>
                <Row
                  icon={icon}
                  title={t(`common.nav.${words}`)}
                  onPress={() => router.push(`/sites/${siteId}/${part}`)}
                />
              </View>
            ))}
          </Rows>
        ) : null}
        <Section title={t('sites.more.sheets')} text={t('sites.more.sheetsTells')}>
          <SheetsList siteId={siteId} />
        </Section>
        <Section title={t('sites.more.screen')}>
          <View style={{ paddingHorizontal: inset, maxWidth: 460 }}>
            <ThemeChoice />
          </View>
        </Section>
        <Section title={t('sites.more.site')}>
          <Rows label={t('sites.more.site')}>
            <View role="listitem">
              <Row icon="menu" title={t('common.nav.allSites')} onPress={() => router.push('/')} />
            </View>
            {manages ? (
              <>
                <View role="listitem">
                  <Row icon="edit" title={t('sites.rename.title')} onPress={() => setOpen('rename')} />
                </View>
                <View role="listitem">
                  <Row icon="delete" title={t('sites.remove.open')} onPress={() => setOpen('delete')} />
                </View>
              </>
            ) : null}
            <View role="listitem">
              <Row icon="person" title={t('auth.account.title')} onPress={() => setOpen('account')} />
            </View>
          </Rows>
        </Section>
        <Section title={t('common.cautions.title')}>
          <Cautions />
        </Section>
      </Page>
      <AccountDialog open={open === 'account'} onClose={close} />
      {site && open === 'rename' ? <RenameSiteDialog site={site} onClose={close} /> : null}
      {site && open === 'delete' ? <DeleteSiteDialog site={site} onClose={close} /> : null}
    </View>
  );
}
