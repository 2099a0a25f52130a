import { Link } from 'expo-router';
import { View } from 'react-native';
import type { SiteSummary } from '../../../model/contracts/sites';
import { Icon } from '../../ui/Icon';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';
import { sayWhen, useNow } from '../../ui/when';
import { useWords } from '../../ui/words';
import { OutlinePicture } from './OutlinePicture';

/** One site of the list: its walls, who the person is there, and whether the draft has run ahead of the revision. */
export function SiteRow({ site }: { site: SiteSummary }) {
  const t = useWords();
  const now = useNow();
  const { colours, strokes } = useTheme();
  const phone = useLayout().name === 'phone';
  const { lastRevision, draftChanged } = site;
  const revision = lastRevision === null ? t('sites.noRevision') : t('sites.revision', { number: lastRevision });
  const ahead = lastRevision !== null && draftChanged ? t('sites.draftChanged', { number: lastRevision }) : null;
  const changed = t('sites.changed', { when: sayWhen(t, site.changedAt, now) });
  return (
    <Link
      href={{ pathname: '/sites/[siteId]/plan', params: { siteId: site.id } }}
      className="row"
      style={{
        display: 'flex',
        borderBottomWidth: strokes.hair,
        borderBottomColor: colours.rule,
        borderStyle: 'solid',
      }}
    >
      <View
        style={{
          flex: 1,
          flexDirection: 'row',
          gap: space.l,
          padding: space.l,
          alignItems: phone ? 'flex-start' : 'center',
        }}
      >
        <OutlinePicture outline={site.outline} size={phone ? 76 : 92} />
        <View
          style={{ flex: 1, flexDirection: phone ? 'column' : 'row', gap: phone ? space.s : space.xl, minWidth: 0 }}
        >
          <View style={{ flex: phone ? undefined : 1.2, minWidth: 0, gap: 2 }}>
            <Txt size="large" weight="semibold">
              {site.name}
            </Txt>
            <Txt tone="soft">
              {t(`sites.youAre.${site.role}`)} · {t('sites.people', { count: site.people })}
            </Txt>
          </View>
          <View style={{ flex: phone ? undefined : 1, minWidth: 0, gap: 2 }}>
            <Txt>{revision}</Txt>
            {ahead ? (
              <Txt weight="medium" tone="caution">
                {ahead}
              </Txt>
            ) : null}
            <Txt size="small" tone="soft">
              {changed}
            </Txt>
          </View>
        </View>
        {phone ? null : <Icon name="forward" size={20} colour={colours.inkSoft} />}
      </View>
    </Link>
  );
}
