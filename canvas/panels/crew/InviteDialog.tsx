import { ROLES, type Role } from '../../../model/contracts/common';
import { ApiError } from '../../client/api';
import { errorWords } from '../../client/errorWords';
import { useInvite } from '../../client/invitations';
import { Button } from '../../ui/Button';
import { Caution } from '../../ui/Caution';
import { Dialog } from '../../ui/Dialog';
import { Field } from '../../ui/Field';
import { toast } from '../../ui/toasts';
import { Txt } from '../../ui/Txt';
import { useForm } from '../../ui/useForm';
import { useWords } from '../../ui/words';
import { checkEmail } from '../auth/checks';
import { RoleList } from './RoleList';

/** Asks for an address and a role, and sends the invitation by mail. */
export function InviteDialog({ siteId, onClose }: { siteId: string; onClose: () => void }) {
  const t = useWords();
  const invite = useInvite(siteId);

  const form = useForm<{ email: string; role: Role }>({
    initial: { email: '', role: 'mason' },
    checks: {
      email: (value) => checkEmail(t, value),
    },
    onSubmit: ({ email, role }) =>
      invite
        .mutateAsync({ email: email.trim(), role })
        .then(() => {
          toast(t('crew.sent', { email: email.trim() }));
          onClose();
        })
        // Shown below, from the mutation.
        .catch(() => {}),
  });

  const already = invite.error instanceof ApiError && invite.error.code === 'alreadyThere';
  return (
    <Dialog
      open
      title={t('crew.inviteTitle')}
      onClose={onClose}
      actions={
        <>
          <Button label={t('common.cancel')} onPress={onClose} />
          <Button kind="filled" label={t('crew.send')} busy={invite.isPending} onPress={form.submit} />
        </>
      }
    >
      <Txt tone="soft">{t('crew.inviteText')}</Txt>
      <Field
        {...form.field('email')}
        label={t('crew.email')}
        inputMode="email"
        autoComplete="off"
        autoCapitalize="none"
        autoFocus
      />
      <RoleList
        label={t('crew.role')}
        roles={ROLES}
        value={form.values.role}
        onChange={(role) => form.set('role', role)}
      />
      {invite.isError ? <Caution text={already ? t('crew.already') : errorWords(t, invite.error)} /> : null}
    </Dialog>
  );
}
