import { useRouter } from 'expo-router';
import { useState } from 'react';
import { View } from 'react-native';
import { may } from '../../../model/contracts/common';
import type { RevisionSummary } from '../../../model/contracts/drawings';
import { useDraft as useFetchedDraft } from '../../client/drafts';
import { errorWords } from '../../client/errorWords';
import { useOnline } from '../../client/online';
import { useRevisions } from '../../client/revisions';
import { useSite } from '../../client/sites';
import { Button } from '../../ui/Button';
import { Header } from '../../ui/Header';
import { Empty, Failed, Loading, Offline } from '../../ui/States';
import { useTheme } from '../../ui/theme';
import { useWords } from '../../ui/words';
import { Page, Rows } from '../shell/Page';
import { PageTitle } from '../shell/PageTitle';
import { Section } from '../shell/Section';
import { ComparePick } from './ComparePick';
import { DraftRow } from './DraftRow';
import { RestoreDialog } from './RestoreDialog';
import { RevisionRow } from './RevisionRow';
import { SaveRevisionDialog } from './SaveRevisionDialog';
import { SetAsideList } from './SetAsideList';

type Open = { readonly kind: 'save' } | { readonly kind: 'restore'; readonly revision: RevisionSummary };

/** The site's revisions: saving the draft as one, seeing, comparing and restoring them, and what was set aside. */
export function RevisionsScreen({ siteId, save: asked = false }: { siteId: string; save?: boolean }) {
  const t = useWords();
  const revisions = useRevisions(siteId);
  const draft = useFetchedDraft(siteId).data;
  const site = useSite(siteId).data;
  const online = useOnline();
  const { colours } = useTheme();
  const [open, setOpen] = useState<Open | null>(null);
  const router = useRouter();
  // Come here to save: the address says so until it is done or given up.
  const saving = asked || open?.kind === 'save';
  const close = () => {
    setOpen(null);
    if (asked) router.setParams({ save: undefined });
  };
  const saves = site !== undefined && may(site.role, 'saveRevision');
  const list = revisions.data ?? [];
  const next = (list[0]?.number ?? 0) + 1;
  const unchanged = draft !== undefined && list.length > 0 && !draft.changedSince;
  const save = (
    <Button
      kind="filled"
      label={t('revisions.save.action', { number: next })}
      disabled={!online || unchanged}
      onPress={() => setOpen({ kind: 'save' })}
    />
  );

  return (
    <View style={{ flex: 1, backgroundColor: colours.ground }}>
      <PageTitle title={`${t('revisions.title')} · ${site?.name ?? ''}`} />
      <Header
        title={t('revisions.title')}
        subtitle={site?.name}
        actions={saves && list.length > 0 ? save : undefined}
      />
      {online ? null : <Offline text={t('revisions.save.offline')} />}
      {revisions.data ? (
        <Page>
          <Rows label={t('revisions.title')}>
            {draft ? <DraftRow draft={draft} newest={list[0]?.number ?? null} /> : null}
            {list.map((revision, index) => (
              <RevisionRow
                key={revision.number}
                siteId={siteId}
                revision={revision}
                newest={index === 0}
                onRestore={saves ? () => setOpen({ kind: 'restore', revision }) : undefined}
              />
            ))}
          </Rows>
          {list.length === 0 ? (
            <Empty
              icon="revisions"
              title={t('revisions.empty.title')}
              text={saves ? t('revisions.empty.text') : t('revisions.empty.view')}
              action={saves ? save : undefined}
            />
          ) : (
            <Section title={t('revisions.compare.pick')}>
              <ComparePick siteId={siteId} revisions={list} />
            </Section>
          )}
          {site && may(site.role, 'editSurvey') ? <SetAsideList siteId={siteId} /> : null}
        </Page>
      ) : revisions.isError ? (
        <Failed
          title={t('revisions.failed')}
          text={errorWords(t, revisions.error)}
          onRetry={() => void revisions.refetch()}
        />
      ) : (
        <Loading />
      )}
      {saving && saves && revisions.data ? <SaveRevisionDialog siteId={siteId} number={next} onClose={close} /> : null}
      {open?.kind === 'restore' ? (
        <RestoreDialog siteId={siteId} number={open.revision.number} onClose={close} />
      ) : null}
    </View>
  );
}
