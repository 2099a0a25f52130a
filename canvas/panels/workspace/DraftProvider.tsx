import { useQuery, useQueryClient } from '@tanstack/react-query';
import { usePathname } from 'expo-router';
import { useEffect, useMemo, useState, type ReactNode } from 'react';
import { ApiError } from '../../client/api';
import { draftQuery } from '../../client/drafts';
import { errorWords } from '../../client/errorWords';
import { useSession } from '../../client/session';
import { useSite } from '../../client/sites';
import { Failed, Loading } from '../../ui/States';
import { useWords } from '../../ui/words';
import { useLatest } from '../../viewport/useLatest';
import { ConflictWatch } from './ConflictWatch';
import { recallLocal } from './localDrafts';
import { openDraft, type OpenDraft } from './openDraft';
import { WorkspaceContext, type Workspace } from './workspace';

/** Parts of a site that show nothing of the drawing, and so need not wait for it. */
const WITHOUT_DRAWING = /^\/sites\/[^/]+\/(crew|more)$/;

/** With a signal too weak for an answer, what the device remembers is opened after this long. */
const ASK_MOST = 4_000;

/** True once the server has answered for this site, or was waited for long enough. */
function useAsked(siteId: string, answered: boolean): boolean {
  const [waitedFor, setWaitedFor] = useState<string | null>(null);
  useEffect(() => {
    const timer = setTimeout(() => setWaitedFor(siteId), ASK_MOST);
    return () => clearTimeout(timer);
  }, [siteId]);
  return answered || waitedFor === siteId;
}

/** Opens the site's draft for every screen inside it, saves it as it changes, and keeps what is unsaved on the device. */
export function DraftProvider({ siteId, children }: { siteId: string; children: ReactNode }) {
  const t = useWords();
  const pathname = usePathname();
  const client = useQueryClient();
  const { session } = useSession();
  const site = useSite(siteId).data;
  // What this device remembers may be from before the last save: the server is asked each time a site is opened.
  const query = useQuery({ ...draftQuery(siteId), refetchOnMount: 'always' });
  const asked = useAsked(siteId, query.isFetchedAfterMount);
  const fetched = query.data;
  const userId = typeof session === 'object' ? session.in.id : null;
  const role = site?.role;
  const [open, setOpen] = useState<OpenDraft | null>(null);
  const ready = userId !== null && role !== undefined && fetched !== undefined && asked;

  const latest = useLatest({ fetched, siteName: site?.name ?? '' });

  useEffect(() => {
    if (!ready) return;
    let opened: OpenDraft | null = null;
    let wanted = true;
    void recallLocal(userId, siteId).then((local) => {
      const { fetched: newest, siteName: name } = latest();
      if (!wanted || !newest) return;
      opened = openDraft({ client, userId, siteId, siteName: name, role, fetched: newest, local });
      setOpen(opened);
    });
    return () => {
      wanted = false;
      opened?.stop();
      setOpen(null);
    };
    // Only who it is and which site decides on opening anew; a newer draft or name is taken over below.
  }, [client, ready, userId, role, siteId, latest]);

  useEffect(() => {
    if (open && fetched)
      open.autosave.offer(fetched.drawing, fetched.survey, {
        drawing: fetched.drawingVersion,
        survey: fetched.surveyVersion,
      });
  }, [open, fetched]);

  useEffect(() => {
    if (!open) return;
    const { autosave } = open;
    const online = () => autosave.online();
    const leaving = () => void autosave.flush();
    globalThis.addEventListener('online', online);
    globalThis.addEventListener('pagehide', leaving);
    return () => {
      globalThis.removeEventListener('online', online);
      globalThis.removeEventListener('pagehide', leaving);
    };
  }, [open]);

  const afterRevision = fetched?.afterRevision ?? null;
  const siteName = site?.name ?? '';
  const workspace = useMemo<Workspace | null>(
    () => open && { ...open.workspace, siteName, of: { kind: 'draft', afterRevision } },
    [open, siteName, afterRevision],
  );

  if (workspace?.solver.get().solved)
    return (
      <WorkspaceContext value={workspace}>
        {children}
        <ConflictWatch />
      </WorkspaceContext>
    );
  if (WITHOUT_DRAWING.test(pathname)) return children;
  if (workspace) return <Failed title={t('plan.failed')} text={t('plan.solveFailed')} />;
  if (!fetched && query.isError) {
    const offline = query.error instanceof ApiError && query.error.code === 'offline';
    return (
      <Failed
        title={t('plan.failed')}
        text={offline ? t('plan.notHere') : errorWords(t, query.error)}
        onRetry={() => void query.refetch()}
      />
    );
  }
  return <Loading label={t('plan.loading')} />;
}
