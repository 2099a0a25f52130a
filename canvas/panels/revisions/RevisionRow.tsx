import { useRouter } from 'expo-router';
import { View } from 'react-native';
import type { RevisionSummary } from '../../../model/contracts/drawings';
import { Button } from '../../ui/Button';
import { space } from '../../ui/tokens';
import { Txt } from '../../ui/Txt';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';
import { sayWhen, useNow } from '../../ui/when';
import { useWords } from '../../ui/words';

interface RevisionRowProps {
  readonly siteId: string;
  readonly revision: RevisionSummary;
  readonly newest: boolean;
  /** Missing where the person may not restore. */
  readonly onRestore?: () => void;
}

/** One revision: its number, its note, who saved it and when. */
export function RevisionRow({ siteId, revision, newest, onRestore }: RevisionRowProps) {
  const t = useWords();
  const now = useNow();
  const router = useRouter();
  const { colours, strokes } = useTheme();
  const phone = useLayout().name === 'phone';
  const { number, note, savedBy, savedAt } = revision;
  const title = t('revisions.revision', { number });
  return (
    <View
      role="listitem"
      style={{
        flexDirection: phone ? 'column' : 'row',
        alignItems: phone ? 'stretch' : 'center',
        gap: space.m,
        paddingHorizontal: space.l,
        paddingVertical: space.m,
        borderBottomWidth: strokes.hair,
        borderColor: colours.rule,
      }}
    >
      <View style={{ flex: phone ? undefined : 1, flexDirection: 'row', gap: space.l, alignItems: 'center' }}>
        <Txt numeric size="ledger" weight="semibold" align="center" aria-hidden style={{ minWidth: 40 }}>
          {number}
        </Txt>
        <View style={{ flex: 1, gap: 2 }}>
          <View style={{ flexDirection: 'row', flexWrap: 'wrap', columnGap: space.s, alignItems: 'baseline' }}>
            <Txt size="large" weight="semibold" role="heading" level={2}>
              {title}
            </Txt>
            {newest ? <Txt tone="soft">{t('revisions.current')}</Txt> : null}
          </View>
          <Txt tone={note === '' ? 'soft' : 'ink'}>{note === '' ? t('revisions.noNote') : note}</Txt>
          <Txt size="small" tone="soft">
            {t('revisions.savedWhen', { when: sayWhen(t, savedAt, now), name: savedBy })}
          </Txt>
        </View>
      </View>
      <View style={{ flexDirection: 'row', gap: space.s, justifyContent: 'flex-end' }}>
        <Button
          size="body"
          label={t('revisions.view.action')}
          spoken={`${t('revisions.view.action')}: ${title}`}
          onPress={() =>
            router.push({ pathname: '/sites/[siteId]/revisions/[number]', params: { siteId, number: String(number) } })
          }
        />
        {onRestore ? (
          <Button
            kind="quiet"
            size="body"
            label={t('revisions.restore.action')}
            spoken={`${t('revisions.restore.action')}: ${title}`}
            onPress={onRestore}
          />
        ) : null}
      </View>
    </View>
  );
}
