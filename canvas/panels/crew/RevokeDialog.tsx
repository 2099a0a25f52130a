import type { Invitation } from '../../../model/contracts/sites';
import { errorWords } from '../../client/errorWords';
import { useRevokeInvitation } from '../../client/invitations';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Dialog } from '../../ui/Dialog';
import { toast } from '../../ui/toasts';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';

interface RevokeDialogProps {
  readonly siteId: string;
  readonly invitation: Invitation;
  readonly onClose: () => void;
}

export function RevokeDialog({ siteId, invitation, onClose }: RevokeDialogProps) {
  const t = useWords();
  const revoke = useRevokeInvitation(siteId);

  async function go() {
    try {
      await revoke.mutateAsync(invitation.id);
      toast(t('crew.revoked', { email: invitation.email }));
      onClose();
    } catch {
      // Shown below, from the mutation.
    }
  }

  return (
    <Dialog
      open
      title={t('crew.revokeTitle', { email: invitation.email })}
      onClose={onClose}
      actions={
        <>
          <Button label={t('common.cancel')} onPress={onClose} />
          <Button
            kind="filled"
            tone="caution"
            label={t('crew.revoke')}
            busy={revoke.isPending}
            onPress={() => void go()}
          />
        </>
      }
    >
      <Txt size="large">{t('crew.revokeText')}</Txt>
      {revoke.isError ? <Caution text={errorWords(t, revoke.error)} /> : null}
    </Dialog>
  );
}
