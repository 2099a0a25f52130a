import { useEffect, useState, type ReactNode } from 'react';
import { errorWords } from '../../client/errorWords';
import { useRevision } from '../../client/revisions';
import { useSite } from '../../client/sites';
import { Failed, Loading } from '../../ui/States';
import { useWords } from '../../ui/words';
import { openRevision } from './openDraft';
import { WorkspaceContext, type Workspace } from './workspace';

/** A revision for the screens inside it, through the same hooks as a draft; nothing of it can be changed. */
export function RevisionProvider(props: { siteId: string; number: number; children: ReactNode }) {
  const { siteId, number, children } = props;
  const t = useWords();
  const siteName = useSite(siteId).data?.name ?? '';
  const { data: revision, error, isError, refetch } = useRevision(siteId, number);
  const [workspace, setWorkspace] = useState<Workspace | null>(null);
  useEffect(() => {
    if (!revision) return;
    const open = openRevision(siteId, siteName, revision);
    setWorkspace(open.workspace);
    return () => {
      open.stop();
      setWorkspace(null);
    };
  }, [siteId, siteName, revision]);

  if (workspace?.solver.get().solved) return <WorkspaceContext value={workspace}>{children}</WorkspaceContext>;
  if (isError && !revision)
    return <Failed title={t('plan.failed')} text={errorWords(t, error)} onRetry={() => void refetch()} />;
  return <Loading label={t('plan.loading')} />;
}
