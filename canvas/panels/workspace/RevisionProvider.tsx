import { useEffect, useMemo, type ReactNode } from 'react';
import { errorWords } from '../../client/errorWords';
import { useRevision } from '../../client/revisions';
import { useSite } from '../../client/sites';
import { Failed, Loading } from '../../ui/States';
import { useWords } from '../../ui/words';
import { openRevision } from './openDraft';
import { WorkspaceContext } from './workspace';

/** A revision for the screens inside it, through the same hooks as a draft; nothing of it can be changed. */
export function RevisionProvider(props: { siteId: string; number: number; children: ReactNode }) {
  const { siteId, number, children } = props;
  const t = useWords();
  const siteName = useSite(siteId).data?.name ?? '';
  const { data: revision, error, isError, refetch } = useRevision(siteId, number);
  const open = useMemo(() => revision && openRevision(siteId, siteName, revision), [siteId, siteName, revision]);
  useEffect(() => open?.stop, [open]);
  const workspace = open?.workspace;

  if (workspace?.solver.get().solved) return <WorkspaceContext value={workspace}>{children}</WorkspaceContext>;
  if (isError && !revision)
    return <Failed title={t('plan.failed')} text={errorWords(t, error)} onRetry={() => void refetch()} />;
  return <Loading label={t('plan.loading')} />;
}
