import { useRouter } from 'expo-router';
import type { Member } from '../../../model/contracts/sites';
import { useRemoveMember } from '../../client/crew';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Dialog } from '../../ui/Dialog';
import { toast } from '../../ui/toasts';
import { Txt } from '../../ui/Txt';
import { useWords } from '../../ui/words';
import { crewErrorWords } from './crewErrorWords';

interface RemoveDialogProps {
  readonly siteId: string;
  readonly siteName: string;
  readonly member: Member;
  readonly me: boolean;
  readonly onClose: () => void;
}

/** Removing someone, or leaving oneself. */
export function RemoveDialog({ siteId, siteName, member, me, onClose }: RemoveDialogProps) {
  const t = useWords();
  const router = useRouter();
  const remove = useRemoveMember(siteId);

  async function go() {
    try {
      await remove.mutateAsync(member.userId);
      toast(me ? t('crew.left', { site: siteName }) : t('crew.removed', { name: member.name }));
      onClose();
      if (me) router.replace('/');
    } catch {
      // Shown below, from the mutation.
    }
  }

  return (
    <Dialog
      open
      title={me ? t('crew.leaveTitle', { site: siteName }) : t('crew.removeTitle', { name: member.name })}
      onClose={onClose}
      actions={
        <>
          <Button label={t('common.cancel')} onPress={onClose} />
          <Button
            kind="filled"
            tone="caution"
            label={me ? t('crew.leave') : t('crew.remove')}
            busy={remove.isPending}
            onPress={() => void go()}
          />
        </>
      }
    >
      <Txt size="large">{me ? t('crew.leaveText') : t('crew.removeText')}</Txt>
      {remove.isError ? <Caution text={crewErrorWords(t, remove.error)} /> : null}
    </Dialog>
  );
}
