import { View } from 'react-native';
import { useState } from 'react';
import { signOut, useSession } from '../../client/session';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Dialog } from '../../ui/Dialog';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { useAuthProblem } from '../auth/useAuthProblem';
import { ThemeChoice } from './ThemeChoice';

/** Who is signed in here, the screen's colours, and the way out. */
export function AccountDialog({ open, onClose }: { open: boolean; onClose: () => void }) {
  const t = useWords();
  const { session } = useSession();
  const problem = useAuthProblem();
  const [refused, setRefused] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const user = typeof session === 'object' ? session.in : null;

  async function leave() {
    setBusy(true);
    setRefused(null);
    try {
      await signOut();
    } catch (error) {
      setRefused(problem(error));
      setBusy(false);
    }
  }

  return (
    <Dialog
      open={open}
      title={t('auth.account.title')}
      onClose={onClose}
      actions={<Button icon="signOut" label={t('auth.account.signOut')} busy={busy} onPress={() => void leave()} />}
    >
      {user ? (
        <View>
          <Txt tone="soft">{t('auth.account.signedInAs')}</Txt>
          <Txt size="large" weight="semibold">
            {user.name}
          </Txt>
          <Txt tone="soft">{user.email}</Txt>
        </View>
      ) : null}
      <ThemeChoice />
      {refused ? <Caution text={refused} /> : null}
    </Dialog>
  );
}
