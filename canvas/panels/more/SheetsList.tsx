import { View } from 'react-native';
import { errorWords } from '../../client/errorWords';
import { sheetsAddress, useRevisions } from '../../client/revisions';
import { Caution } from '../../ui/Caution';
import { Icon } from '../../ui/Icon';
import { Failed, Loading } from '../../ui/States';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';
import { sayWhen, useNow } from '../../ui/when';
import { useWords } from '../../ui/words';
import { Rows } from '../shell/Page';

const SHOWN = 3;

/** The sheets as PDF: of the newest revisions, for the wall, and of the draft, marked as such. */
export function SheetsList({ siteId }: { siteId: string }) {
  const t = useWords();
  const now = useNow();
  const revisions = useRevisions(siteId);
  const phone = useLayout().name === 'phone';
  if (revisions.isPending) return <Loading />;
  if (revisions.isError)
    return <Failed text={errorWords(t, revisions.error)} onRetry={() => void revisions.refetch()} />;
  const newest = revisions.data.slice(0, SHOWN);
  return (
    <View style={{ gap: space.s }}>
      {newest.length === 0 ? (
        <View style={{ paddingHorizontal: phone ? space.l : 0 }}>
          <Caution weight="note" text={t('sites.more.noRevisions')} />
        </View>
      ) : null}
      <Rows label={t('sites.more.sheets')}>
        {newest.map(({ number, savedAt, savedBy }) => (
          <Sheet
            key={number}
            href={sheetsAddress(siteId, number)}
            title={t('sites.more.revisionSheets', { number })}
            text={t('sites.more.revisionSheetsTells', { when: sayWhen(t, savedAt, now), by: savedBy })}
          />
        ))}
        <Sheet
          href={sheetsAddress(siteId, null)}
          title={t('sites.more.draftSheets')}
          text={t('sites.more.draftSheetsTells')}
        />
      </Rows>
    </View>
  );
}

function Sheet({ href, title, text }: { href: string; title: string; text: string }) {
  const t = useWords();
  const { colours, strokes } = useTheme();
  return (
    <View role="listitem">
      <a
        href={href}
        target="_blank"
        rel="noreferrer"
        aria-label={t('sites.more.openPdf', { name: title })}
        className="row"
        style={{
          display: 'flex',
          alignItems: 'center',
          gap: space.l,
          padding: `${space.m}px ${space.l}px`,
          minHeight: 60,
          boxSizing: 'border-box',
          textDecoration: 'none',
          borderBottom: `${strokes.hair}px solid ${colours.rule}`,
        }}
      >
        <Icon name="print" colour={colours.inkSoft} />
        <View style={{ flex: 1 }}>
          <Txt size="large" weight="medium">
            {title}
          </Txt>
          <Txt tone="soft">{text}</Txt>
        </View>
        <Icon name="download" size={20} colour={colours.inkSoft} />
      </a>
    </View>
  );
}
