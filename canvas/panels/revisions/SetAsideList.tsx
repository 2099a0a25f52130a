import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { View } from 'react-native';
import { may } from '../../../model/contracts/common';
import type { SetAside } from '../../../model/contracts/drawings';
import { fetchSetAside, setAsideQuery, useDropSetAside, useSetAside } from '../../client/drafts';
import { errorWords } from '../../client/errorWords';
import { Button } from '../../ui/Button';
import { Dialog } from '../../ui/Dialog';
import { space } from '../../ui/tokens';
import { toast } from '../../ui/toasts';
import { Txt } from '../../ui/Txt';
import { sayWhen, useNow } from '../../ui/when';
import { useWords } from '../../ui/words';
import { PersonRow } from '../crew/PersonRow';
import { Rows } from '../shell/Page';
import { Section } from '../shell/Section';
import { setTheirsAside } from '../workspace/sending';
import { useDraft, useDraftActions } from '../workspace/workspace';

type Asked = { readonly what: 'use' | 'discard'; readonly item: SetAside };

/** What gave way when two people saved at once or a revision was restored: to be taken up again, or thrown away. */
export function SetAsideList({ siteId }: { siteId: string }) {
  const t = useWords();
  const now = useNow();
  const list = useSetAside(siteId).data;
  const drop = useDropSetAside(siteId);
  const role = useDraft((state) => state.role);
  const { get, edit, editSurvey, flush, versions } = useDraftActions();
  const client = useQueryClient();
  const [asked, setAsked] = useState<Asked | null>(null);
  const [busy, setBusy] = useState(false);
  if (!list || list.length === 0) return null;

  /** Puts it on the screen and saves it; then what was there is set aside in its place. */
  async function takeUp(id: string) {
    const { drawing, survey } = await fetchSetAside(siteId, id);
    const before = get();
    if (drawing) edit('revisions.setAside.use', () => drawing);
    if (survey) editSurvey(() => survey);
    if ((await flush()) !== 'saved') {
      toast(t('revisions.save.unsaved'), { tone: 'caution' });
      return;
    }
    const saved = versions();
    if (drawing) await setTheirsAside(siteId, { part: 'drawing', value: before.drawing }, saved.drawing);
    if (survey) await setTheirsAside(siteId, { part: 'survey', value: before.survey }, saved.survey);
    await drop.mutateAsync(id);
    await client.invalidateQueries({ queryKey: setAsideQuery(siteId).queryKey });
  }

  async function go({ what, item }: Asked) {
    setBusy(true);
    try {
      if (what === 'use') {
        await takeUp(item.id);
      } else {
        await drop.mutateAsync(item.id);
      }
      setAsked(null);
    } catch (error) {
      toast(errorWords(t, error), { tone: 'caution' });
    } finally {
      setBusy(false);
    }
  }

  return (
    <Section title={t('revisions.setAside.title')} text={t('revisions.setAside.text')}>
      <Rows label={t('revisions.setAside.title')}>
        {list.map((item) => {
          const name = t(`revisions.setAside.${item.part}`, { name: item.savedBy });
          return (
            <PersonRow
              key={item.id}
              name={name}
              detail={t('revisions.setAside.when', { when: sayWhen(t, item.savedAt, now) })}
              more=""
              end={
                <View style={{ flexDirection: 'row', gap: space.s }}>
                  {may(role, item.part === 'drawing' ? 'editDrawing' : 'editSurvey') ? (
                    <Button
                      size="body"
                      label={t('revisions.setAside.use')}
                      spoken={`${t('revisions.setAside.use')}: ${name}`}
                      onPress={() => setAsked({ what: 'use', item })}
                    />
                  ) : null}
                  <Button
                    kind="quiet"
                    size="body"
                    label={t('revisions.setAside.discard')}
                    spoken={`${t('revisions.setAside.discard')}: ${name}`}
                    onPress={() => setAsked({ what: 'discard', item })}
                  />
                </View>
              }
            />
          );
        })}
      </Rows>
      {asked ? (
        <Dialog
          open
          title={t(asked.what === 'use' ? 'revisions.setAside.useTitle' : 'revisions.setAside.discardTitle')}
          onClose={() => setAsked(null)}
          actions={
            <>
              <Button label={t('common.cancel')} onPress={() => setAsked(null)} />
              <Button
                kind="filled"
                tone={asked.what === 'use' ? 'accent' : 'caution'}
                label={t(asked.what === 'use' ? 'revisions.setAside.use' : 'revisions.setAside.discard')}
                busy={busy}
                onPress={() => void go(asked)}
              />
            </>
          }
        >
          <Txt size="large">
            {t(asked.what === 'use' ? 'revisions.setAside.useText' : 'revisions.setAside.discardText')}
          </Txt>
        </Dialog>
      ) : null}
    </Section>
  );
}
