import { useEffect, useState, type ReactNode } from 'react';
import { whenSignedOut } from '../../client/api';
import { keepOffline, recallOffline } from '../../client/offline';
import { queryClient } from '../../client/queryClient';
import { useSession } from '../../client/session';
import { Failed } from '../../ui/States';
import { useWords } from '../../ui/words';
import { rememberWhereTo } from '../auth/whereTo';
import { Paper } from './Paper';

/**
 * Holds the screens back until it is known who is here: while the session is unknown there is only paper, so that neither
 * the sign-in page nor a site flickers by. For someone signed in, what this device kept for them is brought back first.
 */
export function WaitForSession({ children }: { children: (signedIn: boolean) => ReactNode }) {
  const t = useWords();
  const { session, error, retry } = useSession();
  const userId = typeof session === 'object' ? session.in.id : null;
  const [recalledFor, setRecalledFor] = useState<string | null>(null);
  const [begun, setBegun] = useState(false);

  if (!begun && session !== 'unknown') {
    // The first answer: someone who opened a site's own address is brought there once they have signed in.
    if (session === 'out') rememberWhereTo();
    setBegun(true);
  }
  useEffect(() => whenSignedOut(() => rememberWhereTo()), []);

  useEffect(() => {
    if (userId === null) return;
    let stop = () => {};
    let left = false;
    void recallOffline(queryClient, userId).then(() => {
      if (left) return;
      setRecalledFor(userId);
      stop = keepOffline(queryClient, userId);
    });
    return () => {
      left = true;
      stop();
    };
  }, [userId]);

  if (error)
    return (
      <Paper>
        <Failed title={t('auth.unreachable.title')} text={t('auth.unreachable.text')} onRetry={retry} />
      </Paper>
    );
  if (session === 'unknown' || (userId !== null && recalledFor !== userId)) return <Paper />;
  return children(userId !== null);
}
